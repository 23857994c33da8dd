import { repairsOf, useRepair } from '@/db/queries/paperRepairs'
import { papersOf } from '@/db/queries/papers'
import { touchProposal } from '@/db/queries/proposals'
import { readSnapshot } from '@/db/queries/versions'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { freezeVersion } from '../submission/freezeVersion'
import { lockContents } from '../submission/lockContents'
import { pageLimitOf } from './limits'
import { mayReplacePaper } from './policy'
import { putPaper } from './putPaper'
import { receiveFile } from './receiveFile'
import { isWaiting } from './rules'
import { tellOfReplacement } from './tellOfReplacement'
import type { UploadPaperInput, UploadedPaper } from './uploadPaper'

/** Locks the proposal and finds the repair that waits for this paper, by the stamp of arrival. */
async function opened(tx: ActingContext, input: UploadPaperInput, arrivedAt: Date) {
  const { row, contents } = await lockContents(tx, input.reference)
  authorize(mayReplacePaper(tx.actor, contents))
  const repair = (await repairsOf(tx.db, row.id)).find(
    (one) => one.kind === input.kind && isWaiting(one, arrivedAt),
  )
  const standing = await readSnapshot(tx.db, row.id)
  if (!repair || !standing)
    throw refuse.closed('The office has not opened this paper, or its time is over. Nothing was changed.')
  return { row, contents, repair, standing }
}

/**
 * Puts another file in the place of one paper of a sent proposal, where the office opened it. Everything else stays as
 * it was sent, computed numbers and all; the result is a new version, and the old one is kept with its file.
 */
export async function replacePaper(
  ctx: ActingContext,
  input: UploadPaperInput,
  arrivedAt: Date,
): Promise<UploadedPaper> {
  const pageLimit = await inTransaction(ctx, async (tx) =>
    pageLimitOf(input.kind, (await opened(tx, input, arrivedAt)).contents.kind),
  )
  const file = await receiveFile(ctx, input, pageLimit)

  return inTransaction(ctx, async (tx) => {
    const { row, contents, repair, standing } = await opened(tx, input, arrivedAt)
    const before = standing.snapshot.contents.papers.find(({ kind }) => kind === input.kind)
    const paperId = await putPaper(
      tx,
      { proposalId: row.id, kind: input.kind, uploadedBy: tx.actor.personId },
      file,
    )
    // What stands beside it is what was sent: a reopened draft may hold other files by now.
    const others = standing.snapshot.contents.papers.filter(({ kind }) => kind !== input.kind)
    const mended = (await papersOf(tx.db, row.id)).filter(({ id }) => id === paperId)
    const snapshot = {
      ...standing.snapshot,
      contents: { ...standing.snapshot.contents, papers: [...others, ...mended] },
    }
    const submission = await freezeVersion(tx, snapshot, {
      paperId: input.kind === 'justification' ? paperId : standing.paperId,
      idempotencyKey: `repair-${repair.id}`,
      arrivedAt,
    })
    if (!(await useRepair(tx.db, repair.id, { versionId: submission.versionId, arrivedAt })))
      throw refuse.closed('The office has closed this paper meanwhile. Nothing was changed.')
    await touchProposal(tx.db, row.id)
    await tellOfReplacement(tx, { contents, submission, kind: input.kind, fileName: file.fileName })
    await writeLogbook(tx, {
      action: 'papers.repair',
      subject: { kind: 'proposal', id: contents.reference },
      actingAs: 'investigator',
      before: { kind: input.kind, fileName: before?.fileName, sha256: before?.sha256 },
      after: {
        kind: input.kind,
        fileName: file.fileName,
        pages: file.pages,
        sha256: file.sha256,
        version: submission.versionNumber,
        reason: repair.reason,
      },
    })
    return { paperId, fileName: file.fileName, pages: file.pages, replaced: before?.fileName ?? null }
  })
}
