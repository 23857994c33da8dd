import { databaseNow } from '@/db/queries/clock'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { newObjectKey } from '../objects/objectKey'
import { arrivedFile } from './arrivedFile'
import { inspectPdf, type Inspected } from './inspectPdf'
import { maxPaperBytes } from './limits'
import { shownName } from './shownName'

export interface ReceivedFile extends Inspected {
  fileName: string
  sha256: string
  sizeBytes: number
  objectKey: string
}

/**
 * Looks a document through and puts it into the store. The object is put before any row is written: should the
 * transaction that follows be lost, an object without a row is swept later, and no row ever points at nothing.
 */
export async function receiveFile(
  ctx: Context,
  sent: { file: File; sha256: string; sizeBytes: number },
  pageLimit: number,
): Promise<ReceivedFile> {
  if (sent.file.size > maxPaperBytes) throw refuse.field('file', 'The file is larger than 20 MB.')
  const bytes = await arrivedFile(sent)
  const fileName = shownName(sent.file.name, 'document.pdf')
  const { pages } = await inspectPdf(bytes, fileName, pageLimit)
  const objectKey = newObjectKey(ctx.random, await databaseNow(ctx.db))
  await ctx.storage.put(objectKey, bytes, 'application/pdf')
  return { pages, fileName, sha256: sent.sha256, sizeBytes: bytes.length, objectKey }
}
