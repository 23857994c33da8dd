import { insertPaper, supersedePapers } from '@/db/queries/papers'
import { insertStoredObject } from '@/db/queries/storedObjects'
import type { Context } from '../context'
import type { Paper } from '../proposals/writingTypes'
import type { ReceivedFile } from './receiveFile'

/** Writes the rows of a document just received; the one of its kind that stood is superseded, and kept. */
export async function putPaper(
  tx: Context,
  paper: { proposalId: number; kind: Paper['kind']; uploadedBy: number },
  file: ReceivedFile,
): Promise<number> {
  const objectId = await insertStoredObject(tx.db, {
    key: file.objectKey,
    sha256: file.sha256,
    sizeBytes: file.sizeBytes,
    contentType: 'application/pdf',
    purpose: 'paper',
  })
  await supersedePapers(tx.db, paper.proposalId, paper.kind)
  const { fileName, pages } = file
  return insertPaper(tx.db, { ...paper, objectId, fileName, pages })
}
