import { setAssessmentRequests } from '@/db/queries/submission'
import { findVersionByKey, readSnapshot } from '@/db/queries/versions'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { billProposal } from '../fees/billProposal'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { computationOf } from '../proposals/computationOf'
import { mayReadProposal, maySendProposal } from '../proposals/policy'
import { readContents } from '../proposals/readContents'
import { leftOut, namedOnSending } from '../proposals/namedOnSending'
import type { ProposalContents } from '../proposals/types'
import { checkPaper } from './checkPaper'
import { demandComplete } from './demandComplete'
import { freezeVersion, type Submission } from './freezeVersion'
import { lockContents } from './lockContents'
import { markSent } from './markSent'
import { instrumentsUsed } from './rules'
import { sendConfirmations } from './sendConfirmations'

export interface SubmitInput {
  reference: string
  /** One press of the button: the same key twice is the same submission and the same answer. */
  idempotencyKey: string
  /** Everyone named has read this version and agrees to it being sent. */
  declaration: boolean
  /** Stamped by the database's clock as the first thing the request did: it alone is held against the deadline. */
  arrivedAt: Date
}

/** Sends a proposal in: freezes it whole, bills it and confirms it in one transaction, or does nothing. */
export async function submitProposal(ctx: ActingContext, input: SubmitInput): Promise<Submission> {
  const draft = await readContents(ctx.db, input.reference)
  authorize(mayReadProposal(ctx.actor, draft))
  if (!input.declaration)
    throw refuse.field('declaration', 'Say that everyone named agrees to it being sent.')
  if (draft.state === 'draft' || draft.isReopened) await checkPaper(ctx, draft)

  return inTransaction(ctx, async (tx) => {
    const { row, contents: found } = await lockContents(tx, input.reference)
    const before = await sentBefore(tx, found, input.idempotencyKey)
    if (before) return before

    authorize(maySendProposal(tx.actor, found, input.arrivedAt))
    const computation = computationOf(found)
    const paperId = demandComplete(found, computation)
    const reviewNumber = await markSent(tx, row, found, input.arrivedAt)
    const people = namedOnSending(found.people)
    const contents = { ...found, people, reviewNumber, state: 'submitted' as const, isReopened: false }
    const submission = await freezeVersion(
      tx,
      { contents, computation, engineVersion: computation.engineVersion },
      { paperId, idempotencyKey: input.idempotencyKey, arrivedAt: input.arrivedAt },
    )
    const fee = await billProposal(tx, contents, input.arrivedAt)
    await setAssessmentRequests(tx.db, contents.id, instrumentsUsed(contents))
    await sendConfirmations(tx, { contents, submission, fee })
    await writeLogbook(tx, {
      action: 'proposal.send',
      subject: { kind: 'proposal', id: contents.reference },
      actingAs: 'investigator',
      before: { state: found.state, isReopened: found.isReopened },
      after: { state: 'submitted', ...submission, leftOut: leftOut(found.people).map(({ name }) => name) },
    })
    return submission
  })
}

/** The answer given before: to the same key, or to whoever sent it a moment ago from another window. */
async function sentBefore(
  tx: ActingContext,
  contents: ProposalContents,
  idempotencyKey: string,
): Promise<Submission | null> {
  authorize(mayReadProposal(tx.actor, contents))
  const known = await findVersionByKey(tx.db, idempotencyKey)
  if (known && known.proposalId !== contents.id)
    throw refuse.invalid('This form belongs to another proposal. Load the page again.')
  const isIn = contents.state === 'submitted' && !contents.isReopened
  const sent = known ?? (isIn ? await readSnapshot(tx.db, contents.id) : null)
  if (!sent) return null
  const { id: versionId, proposalId, versionNumber, arrivedAt, sha256 } = sent
  return { reference: contents.reference, proposalId, versionId, versionNumber, arrivedAt, sha256 }
}
