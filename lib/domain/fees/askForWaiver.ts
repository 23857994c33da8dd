import { insertWaiver, latestWaiver, lockFeeOf } from '@/db/queries/fees'
import { officePeople } from '@/db/queries/roleHolders'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { waiverAsked } from '../outbox/letters/waiverAsked'
import { queueLetter } from '../outbox/queueLetter'
import { readContents } from '../proposals/readContents'
import { mayAskForWaiver } from './policy'
import { whyNotPayable } from './rules'

/**
 * Asks the office to waive the fee of a proposal; everyone in the office is written to. Until it is decided, the
 * proposal does not lapse for the fee.
 */
export async function askForWaiver(
  ctx: ActingContext,
  input: { reference: string; reason: string },
): Promise<{ waiverId: number }> {
  return inTransaction(ctx, async (tx) => {
    const fee = await lockFeeOf(tx.db, input.reference)
    const contents = await readContents(tx.db, input.reference)
    authorize(mayAskForWaiver(tx.actor, contents))
    if (!fee) throw refuse.closed('Nothing is owed for this proposal.')
    const why = whyNotPayable(fee.state)
    if (why) throw refuse.closed(why)
    const last = await latestWaiver(tx.db, fee.id)
    if (last?.state === 'asked')
      throw refuse.closed('A waiver has been asked for already. The office decides it.')
    if (last?.state === 'refused')
      throw refuse.closed('A waiver was asked for and refused. Write to the office.')
    const waiverId = await insertWaiver(tx.db, {
      feeId: fee.id,
      reason: input.reason,
      askedBy: tx.actor.personId,
    })
    const facts = {
      reference: contents.reference,
      title: contents.title,
      askedBy: tx.actor.name,
      reason: input.reason,
      amountMinor: fee.amount_minor,
      currency: fee.currency,
      dueAt: fee.due_at,
      url: `${tx.request.origin}${paths.office('fees')}?call=${encodeURIComponent(contents.call.slug)}`,
    }
    for (const person of await officePeople(tx.db))
      await queueLetter(tx, person, waiverAsked({ name: person.name, ...facts }), `waiver-asked:${waiverId}`)
    await writeLogbook(tx, {
      action: 'fee.ask-waiver',
      subject: { kind: 'proposal', id: contents.reference },
      actingAs: 'investigator',
      after: { waiverId },
    })
    return { waiverId }
  })
}
