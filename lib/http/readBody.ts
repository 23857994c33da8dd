import { refuse } from '../errors'

/** The body as text, given up as soon as it grows past the limit. */
export async function readBody(request: Request, maxBytes: number): Promise<string> {
  const reader = request.body?.getReader()
  if (!reader) return ''
  const chunks: Uint8Array[] = []
  let size = 0
  for (;;) {
    const { done, value } = await reader.read()
    if (done) break
    size += value.byteLength
    if (size > maxBytes) {
      await reader.cancel()
      throw refuse.tooLarge(`At most ${maxBytes.toLocaleString('en-GB')} bytes can be sent here.`)
    }
    chunks.push(value)
  }
  return Buffer.concat(chunks).toString('utf8')
}
