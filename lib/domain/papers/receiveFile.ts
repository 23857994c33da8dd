import { createHash } from 'node:crypto'
import { databaseNow } from '@/db/queries/clock'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { newObjectKey } from '../objects/objectKey'
import { cleanText } from '../proposals/cleanText'
import { inspectPdf, type Inspected } from './inspectPdf'
import { maxPaperBytes } from './limits'

export interface ReceivedFile extends Inspected {
  fileName: string
  sha256: string
  sizeBytes: number
  objectKey: string
}

/** The last part of a file's name, one line, short enough to keep. It is shown, never used as a path. */
const shownName = (name: string) =>
  (cleanText(name).split(/[\\/]/).at(-1) ?? '').replace(/\s+/g, ' ').trim().slice(-200) || 'document.pdf'

interface Sent {
  file: File
  sha256: string
  sizeBytes: number
}

async function arrived(sent: Sent): Promise<{ bytes: Uint8Array; sha256: string }> {
  if (sent.file.size > maxPaperBytes) throw refuse.field('file', 'The file is larger than 20 MB.')
  const bytes = new Uint8Array(await sent.file.arrayBuffer())
  const sha256 = createHash('sha256').update(bytes).digest('hex')
  if (bytes.length !== sent.sizeBytes || sha256 !== sent.sha256)
    throw refuse.field('file', 'The file was damaged on its way here. Nothing was changed; send it again.')
  return { bytes, sha256 }
}

/**
 * Looks a document through and puts it into the store. The object is put before any row is written: should the
 * transaction that follows be lost, an object without a row is swept later, and no row ever points at nothing.
 */
export async function receiveFile(
  ctx: Context,
  sent: Sent,
  limits: { pages: number; words: number | null },
): Promise<ReceivedFile> {
  const { bytes, sha256 } = await arrived(sent)
  const fileName = shownName(sent.file.name)
  const inspected = await inspectPdf(bytes, fileName, limits)
  const objectKey = newObjectKey(ctx.random, await databaseNow(ctx.db))
  await ctx.storage.put(objectKey, bytes, 'application/pdf')
  return { ...inspected, fileName, sha256, sizeBytes: bytes.length, objectKey }
}
