import type { z } from 'zod'
import { databaseNow } from '@/db/queries/clock'
import { keepDecision, lockDisputeById, placeOfDispute } from '@/db/queries/disputes'
import { lockFee, updateFee } from '@/db/queries/fees'
import { moveMoney, type MoneyAccount } from '@/db/queries/moneyLedger'
import type { FeesRow, ProposalsRow } from '@/db/tables'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { disputeDecided } from '../outbox/letters/disputeDecided'
import { queueLetter } from '../outbox/queueLetter'
import { namedOnSending } from '../proposals/namedOnSending'
import { lockContents } from '../submission/lockContents'
import { takeOut } from '../submission/takeOut'
import { disputeChoices, type DisputeDecision } from './disputeRules'
import { isSurplusPayment } from './isSurplusPayment'
import { oweAgain } from './oweAgain'
import { mayHandleFees } from './policy'
import type { decideDisputeSchema } from './schema'

const dayMs = 86_400_000

/** Where the money that is gone stands once it is decided; a loss that is taken stays where it is. */
const bookedTo: Record<Exclude<DisputeDecision, 'accept'>, MoneyAccount> = {
  'ask-again': 'receivable',
  waive: 'waived',
  withdraw: 'income',
}

/** Says what becomes of a fee whose payment a card holder's bank took back. On record, mailed, and in the books. */
export async function decideDispute(
  ctx: ActingContext,
  input: z.output<typeof decideDisputeSchema>,
): Promise<void> {
  authorize(mayHandleFees(ctx.actor))
  await inTransaction(ctx, async (tx) => {
    const place = await placeOfDispute(tx.db, input.disputeId)
    if (!place) throw refuse.notFound('dispute')
    const { row, contents } = await lockContents(tx, place.proposalId)
    const fee = await lockFee(tx.db, place.feeId)
    const dispute = await lockDisputeById(tx.db, input.disputeId)
    if (!fee || !dispute) throw refuse.integrity('The fee of this dispute is missing.')
    if (dispute.state !== 'lost') throw refuse.closed('Only a dispute that is lost is decided.')
    const isSurplus = await isSurplusPayment(tx, dispute.payment_id)
    const { decision, note } = input
    if (!disputeChoices({ dispute, fee, proposalState: row.state, isSurplus }).includes(decision))
      throw refuse.closed('That cannot be done about this fee as it stands. Load the page again.')
    if (!(await keepDecision(tx.db, dispute.id, { decision, note, decidedBy: tx.actor.personId })))
      throw refuse.closed('This dispute has been decided already. Load the page again.')

    const dueAt = new Date((await databaseNow(tx.db)).getTime() + input.graceDays * dayMs)
    if (decision !== 'accept') {
      await settle(tx, { row, fee, decision, note, dueAt })
      await moveMoney(tx.db, {
        movement: `dispute-decided:${dispute.id}`,
        feeId: fee.id,
        from: 'lost',
        to: bookedTo[decision],
        amountMinor: dispute.amount_minor,
        currency: fee.currency,
      })
      const { reference, title } = contents
      const money = { amountMinor: fee.amount_minor, currency: fee.currency }
      const facts = { reference, title, ...money, decision, note, dueAt }
      const url = `${tx.request.origin}${paths.proposalSent(reference)}`
      for (const person of namedOnSending(contents.people).filter(
        ({ role }) => decision === 'withdraw' || role === 'pi',
      ))
        await queueLetter(
          tx,
          person,
          disputeDecided({ ...facts, name: person.name, url }),
          `dispute-decided:${dispute.id}`,
        )
    }
    await writeLogbook(tx, {
      action: 'fee.decide-dispute',
      subject: { kind: 'proposal', id: contents.reference },
      actingAs: 'office',
      before: { fee: fee.state, proposal: row.state },
      after: {
        decision,
        note,
        amountMinor: dispute.amount_minor,
        currency: fee.currency,
        ...(decision === 'ask-again' ? { dueAt } : {}),
      },
    })
  })
}

async function settle(
  tx: ActingContext,
  decided: {
    row: ProposalsRow
    fee: FeesRow
    decision: Exclude<DisputeDecision, 'accept'>
    note: string
    dueAt: Date
  },
): Promise<void> {
  const { row, fee, decision, note, dueAt } = decided
  if (decision === 'ask-again') return oweAgain(tx, fee, dueAt)
  if (decision === 'withdraw') await takeOut(tx, row, { state: 'withdrawn', reason: note })
  if (!(await updateFee(tx.db, fee, decision === 'waive' ? 'waived' : 'cancelled')))
    throw refuse.closed('The fee has changed a moment ago. Load the page again.')
}
