import { createHash } from 'node:crypto'
import { refuse } from '@/lib/errors'

/** The bytes of a file, held against what the browser says it sent. */
export async function arrivedFile(input: {
  file: File
  sha256: string
  sizeBytes: number
}): Promise<Uint8Array> {
  const bytes = new Uint8Array(await input.file.arrayBuffer())
  const sha256 = createHash('sha256').update(bytes).digest('hex')
  if (bytes.length !== input.sizeBytes || sha256 !== input.sha256)
    throw refuse.field('file', 'The file was damaged on its way here. Nothing was changed; send it again.')
  return bytes
}
