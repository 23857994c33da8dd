/** What became of a form on its way. */
export type FormReply =
  { kind: 'kept'; data: unknown } | { kind: 'refused'; message: string; again: boolean } | { kind: 'lost' }

export interface SendFormOptions {
  signal: AbortSignal
  /** How much has gone, bytes, of how many; both count the fields too. */
  onSent: (sent: number, total: number) => void
}

/** A connection that moves no byte for so long is given up. */
const stalledMs = 45_000
/** How long the observatory may look a file through. */
const silentMs = 180_000

const text = (value: unknown) => (typeof value === 'string' ? value : null)

/** A refusal as its problem details (RFC 9457) say it, the file's own sentence first. */
function refusalOf(status: number, body: unknown): FormReply {
  const { detail, errors } = (body ?? {}) as { detail?: unknown; errors?: unknown }
  const ofFile = Array.isArray(errors)
    ? (errors as { pointer?: unknown; detail?: unknown }[]).find(({ pointer }) => pointer === '/file')
    : undefined
  const message = text(ofFile?.detail) ?? text(detail) ?? 'The observatory did not answer as it should.'
  // The file was not to blame, so the same one may get through a minute later.
  return { kind: 'refused', message, again: status >= 500 || status === 429 }
}

/**
 * Sends a form and says how much of it has gone, which fetch cannot. Rejects with the signal's reason when stopped; a
 * connection that failed or stands still is a reply of its own.
 */
export function sendForm(
  url: string,
  form: FormData,
  { signal, onSent }: SendFormOptions,
): Promise<FormReply> {
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest()
    let patience: ReturnType<typeof setTimeout>
    const waitFor = (ms: number) => {
      clearTimeout(patience)
      patience = setTimeout(() => {
        settle(() => resolve({ kind: 'lost' }))
        request.abort()
      }, ms)
    }
    const stop = () => {
      settle(() => reject(signal.reason as Error))
      request.abort()
    }
    const settle = (how: () => void) => {
      clearTimeout(patience)
      signal.removeEventListener('abort', stop)
      how()
    }
    signal.addEventListener('abort', stop)
    request.upload.onprogress = ({ loaded, total }) => {
      waitFor(stalledMs)
      onSent(loaded, total)
    }
    request.upload.onload = () => waitFor(silentMs)
    request.onerror = () => settle(() => resolve({ kind: 'lost' }))
    request.onload = () => {
      const { status, response } = request as { status: number; response: unknown }
      settle(() => resolve(status === 200 ? { kind: 'kept', data: response } : refusalOf(status, response)))
    }
    request.open('POST', url)
    request.responseType = 'json'
    waitFor(stalledMs)
    request.send(form)
  })
}
