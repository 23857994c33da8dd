import { authorize } from '@/lib/auth/authorize'
import { paths } from '@/lib/paths'
import { deadlineOf } from '../calls/rules'
import type { ActingContext } from '../context'
import { cancelFee } from '../fees/cancelFee'
import { tryRefunds } from '../fees/tryRefunds'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { proposalWithdrawn } from '../outbox/letters/proposalWithdrawn'
import { queueLetter } from '../outbox/queueLetter'
import { namedOnSending } from '../proposals/namedOnSending'
import { lockContents } from './lockContents'
import { mayWithdrawProposal } from './policy'
import { takeOut } from './takeOut'

/** Withdraws a proposal for good. Before its deadline the fee goes with it, and what was paid comes back in full. */
export async function withdrawProposal(
  ctx: ActingContext,
  input: { reference: string; reason: string; arrivedAt: Date },
): Promise<{ fee: 'none' | 'kept' | 'cancelled' | 'refunded' }> {
  const fee = await inTransaction(ctx, async (tx) => {
    const { row, contents } = await lockContents(tx, input.reference)
    authorize(mayWithdrawProposal(tx.actor, contents))
    await takeOut(tx, row, { state: 'withdrawn', reason: input.reason })
    const isEarly = input.arrivedAt < deadlineOf(contents.call, contents.kind, contents)
    const outcome = isEarly
      ? await cancelFee(tx, contents.id, { state: 'cancelled', reason: 'withdrawn before the deadline' })
      : ('kept' as const)
    const url = `${tx.request.origin}${paths.proposal(contents.reference)}`
    for (const person of namedOnSending(contents.people)) {
      const letter = proposalWithdrawn({
        name: person.name,
        ...contents,
        by: tx.actor.name,
        fee: outcome,
        url,
      })
      await queueLetter(tx, person, letter, `withdrawn:${contents.id}`)
    }
    await writeLogbook(tx, {
      action: 'proposal.withdraw',
      subject: { kind: 'proposal', id: contents.reference },
      actingAs: 'investigator',
      before: { state: contents.state },
      after: { state: 'withdrawn', reason: input.reason, fee: outcome },
    })
    return outcome
  })
  if (fee === 'refunded') await tryRefunds(ctx)
  return { fee }
}
