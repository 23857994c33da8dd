import type { z } from 'zod'
import { papersOf } from '@/db/queries/papers'
import { touchProposal } from '@/db/queries/proposals'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'
import { pageLimitOf } from './limits'
import { putPaper } from './putPaper'
import { receiveFile } from './receiveFile'
import type { uploadPaperSchema } from './schema'

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
  return inTransaction(ctx, async (tx) =>
    pageLimitOf(input.kind, (await openForEditing(tx, input.reference)).subject.kind),
  )
}

/** Keeps a document of a proposal in the place of the one that stood. */
export async function uploadPaper(ctx: Context, input: UploadPaperInput): Promise<UploadedPaper> {
  const file = await receiveFile(ctx, input, await pageLimit(ctx, input))

  return inTransaction(ctx, async (tx) => {
    const { row, actor } = await openForEditing(tx, input.reference)
    const before = (await papersOf(tx.db, row.id)).find(({ kind }) => kind === input.kind)
    const { fileName, pages, sha256 } = file
    const paper = { proposalId: row.id, kind: input.kind, uploadedBy: actor.personId }
    const paperId = await putPaper(tx, paper, file)
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
