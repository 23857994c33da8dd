import type { FeesRow } from '@/db/tables'
import { paths } from '@/lib/paths'
import { deadlineOf } from '../calls/rules'
import type { Context } from '../context'
import { proposalSent } from '../outbox/letters/proposalSent'
import { queueLetter } from '../outbox/queueLetter'
import type { ProposalContents } from '../proposals/types'
import type { Submission } from './freezeVersion'

/** The receipt is part of the sending: every investigator gets a letter, written in the same transaction. */
export async function sendConfirmations(
  tx: Context,
  sent: { contents: ProposalContents; submission: Submission; fee: FeesRow | null },
): Promise<void> {
  const { contents, submission, fee } = sent
  const url = `${tx.request.origin}${paths.proposalSent(contents.reference)}`
  const facts = {
    title: contents.title,
    callNumber: contents.call.number,
    deadline: deadlineOf(contents.call, contents.kind, contents),
    ...submission,
    fee: fee && {
      amountMinor: fee.amount_minor,
      currency: fee.currency,
      dueAt: fee.due_at,
      state: fee.state,
    },
    url,
  }
  const cause = `sent:${contents.id}:${submission.versionNumber}`
  for (const person of contents.people)
    await queueLetter(tx, person, proposalSent({ name: person.name, ...facts }), cause)
}
