import { refuse } from '../errors'

/** The body, given up as soon as it grows past the limit. */
export async function readBody(request: Request, maxBytes: number): Promise<Buffer<ArrayBuffer>> {
  const reader = request.body?.getReader()
  if (!reader) return Buffer.alloc(0)
  const chunks: Uint8Array[] = []
  let size = 0
  for (;;) {
    const { done, value } = await reader.read().catch(() => {
      throw refuse.invalid('The body broke off.')
    })
    if (done) break
    size += value.byteLength
    if (size > maxBytes) {
      await reader.cancel()
      throw refuse.tooLarge(`At most ${maxBytes.toLocaleString('en-GB')} bytes can be sent here.`)
    }
    chunks.push(value)
  }
  return Buffer.concat(chunks)
}
