import { closeWaiver, findWaiver, lockFee, updateFee } from '@/db/queries/fees'
import { moveMoney } from '@/db/queries/moneyLedger'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { waiverDecided } from '../outbox/letters/waiverDecided'
import { queueLetter } from '../outbox/queueLetter'
import { readContents } from '../proposals/readContents'
import { mayDecideWaiver } from './policy'
import { whyNotPayable } from './rules'

/** Grants or refuses a waiver: granted, the fee is settled; refused, it stays due. The investigators are told. */
export async function decideWaiver(
  ctx: ActingContext,
  input: { waiverId: number; decision: 'granted' | 'refused'; note: string },
): Promise<void> {
  await inTransaction(ctx, async (tx) => {
    authorize(mayDecideWaiver(tx.actor))
    const waiver = await findWaiver(tx.db, input.waiverId)
    const fee = waiver && (await lockFee(tx.db, waiver.fee_id))
    if (!waiver || !fee) throw refuse.notFound('request')
    const why = whyNotPayable(fee.state)
    if (why) throw refuse.closed(why)
    const outcome = { state: input.decision, note: input.note, decidedBy: tx.actor.personId }
    if (!(await closeWaiver(tx.db, waiver.id, outcome)))
      throw refuse.closed('This request has been decided already. Load the page again.')
    if (input.decision === 'granted') {
      await updateFee(tx.db, fee, 'waived')
      await moveMoney(tx.db, {
        movement: `waived:${fee.id}`,
        feeId: fee.id,
        from: 'receivable',
        to: 'waived',
        amountMinor: fee.amount_minor,
        currency: fee.currency,
      })
    }
    const contents = await readContents(tx.db, fee.proposal_id)
    const facts = {
      reference: contents.reference,
      title: contents.title,
      amountMinor: fee.amount_minor,
      currency: fee.currency,
      dueAt: fee.due_at,
      decision: input.decision,
      note: input.note,
      url: `${tx.request.origin}${paths.proposalSent(contents.reference)}`,
    }
    for (const person of contents.people.filter(
      ({ role, personId }) => role === 'pi' || personId === waiver.asked_by,
    ))
      await queueLetter(tx, person, waiverDecided({ name: person.name, ...facts }), `waiver:${waiver.id}`)
    await writeLogbook(tx, {
      action: 'fee.decide-waiver',
      subject: { kind: 'proposal', id: contents.reference },
      actingAs: 'office',
      after: { waiverId: waiver.id, decision: input.decision, note: input.note },
    })
  })
}
