import { refuse } from '../errors'
import { plainForm } from './plainForm'

/** The fields and files of a multipart body that has been read whole. */
export async function readForm(request: Request, bytes: Uint8Array<ArrayBuffer>): Promise<object> {
  const type = request.headers.get('content-type') ?? ''
  try {
    return plainForm(await new Response(bytes, { headers: { 'content-type': type } }).formData())
  } catch {
    throw refuse.invalid('The form cannot be read.')
  }
}
