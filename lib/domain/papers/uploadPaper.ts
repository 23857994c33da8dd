import type { z } from 'zod'
import { databaseNow } from '@/db/queries/clock'
import { insertPaper, papersOf, supersedePapers } from '@/db/queries/papers'
import { touchProposal } from '@/db/queries/proposals'
import { insertStoredObject } from '@/db/queries/storedObjects'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { newObjectKey } from '../objects/objectKey'
import { openForEditing } from '../proposals/openProposal'
import { arrivedFile } from './arrivedFile'
import { inspectPdf } from './inspectPdf'
import { maxExpertisePages, maxPaperBytes } from './limits'
import type { uploadPaperSchema } from './schema'
import { shownName } from './shownName'

export type UploadPaperInput = z.output<typeof uploadPaperSchema>

export interface UploadedPaper {
  paperId: number
  fileName: string
  pages: number
  /** Name of the document it took the place of. */
  replaced: string | null
}

/** Who may, and the most pages, asked before the slow looking through; asked again when it is written. */
async function pageLimit(ctx: Context, input: UploadPaperInput): Promise<number> {
  return inTransaction(ctx, async (tx) => {
    const { subject } = await openForEditing(tx, input.reference)
    return input.kind === 'justification' ? subject.kind.pageLimit : maxExpertisePages
  })
}

/**
 * Keeps a document of a proposal. The object is put before its row is written: should the transaction be lost,
 * an object without a row is swept later, and no row ever points at nothing.
 */
export async function uploadPaper(ctx: Context, input: UploadPaperInput): Promise<UploadedPaper> {
  const limit = await pageLimit(ctx, input)
  if (input.file.size > maxPaperBytes) throw refuse.field('file', 'The file is larger than 20 MB.')
  const bytes = await arrivedFile(input)
  const { sha256 } = input
  const fileName = shownName(input.file.name, 'document.pdf')
  const { pages } = await inspectPdf(bytes, fileName, limit)
  const key = newObjectKey(ctx.random, await databaseNow(ctx.db))
  await ctx.storage.put(key, bytes, 'application/pdf')

  return inTransaction(ctx, async (tx) => {
    const { row, actor } = await openForEditing(tx, input.reference)
    const before = (await papersOf(tx.db, row.id)).find(({ kind }) => kind === input.kind)
    const objectId = await insertStoredObject(tx.db, {
      key,
      sha256,
      sizeBytes: bytes.length,
      contentType: 'application/pdf',
      purpose: 'paper',
    })
    await supersedePapers(tx.db, row.id, input.kind)
    const paperId = await insertPaper(tx.db, {
      proposalId: row.id,
      objectId,
      kind: input.kind,
      fileName,
      pages,
      uploadedBy: actor.personId,
    })
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'papers.add',
      subject: { kind: 'proposal', id: row.reference },
      actingAs: 'investigator',
      before: before ? { kind: before.kind, fileName: before.fileName } : undefined,
      after: { kind: input.kind, fileName, pages, sha256 },
    })
    return { paperId, fileName, pages, replaced: before?.fileName ?? null }
  })
}
