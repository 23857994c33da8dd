import { applyFirmState } from '../../../lib/domain/fees/applyFirmState.ts'
import { readFirmState } from '../../../lib/domain/fees/readFirmState.ts'
import { refundFee } from '../../../lib/domain/fees/refundFee.ts'
import type { SeededCall } from '../calls.ts'
import type { PastPayments } from './pastPayments.ts'
import type { Teller } from './teller.ts'

const dayMs = 86_400_000

interface Paid {
  id: number
  session: string
  reference: string
  paidAt: Date
}

/** Card payments of a call, the oldest first. */
async function cardPayments(story: Teller, call: SeededCall): Promise<Paid[]> {
  const rows = await story
    .db('payments as m')
    .join('fees as f', 'f.id', 'm.fee_id')
    .join('proposals as p', 'p.id', 'f.proposal_id')
    .where({ 'p.call_id': call.id, 'm.state': 'succeeded' })
    .orderBy('m.succeeded_at')
    .select('m.id', 'm.provider_session_id', 'm.succeeded_at', 'p.reference')
  return rows.map((row) => ({
    id: row.id,
    session: row.provider_session_id ?? '',
    reference: row.reference,
    paidAt: row.succeeded_at ?? new Date(0),
  }))
}

/** What came after the payments of two calls: a part given back and a dispute won, then a dispute that is still open. */
export async function afterPayments(
  story: Teller,
  firm: PastPayments,
  calls: { decided: SeededCall; inReview: SeededCall },
): Promise<void> {
  const [, given, disputed] = await cardPayments(story, calls.decided)
  const [, , , open] = await cardPayments(story, calls.inReview)
  const later = (paid: Paid, days: number) => story.at(new Date(paid.paidAt.getTime() + days * dayMs))
  const tell = async (paid: Paid, status: 'open' | 'won') => {
    firm.dispute(paid.session, status)
    await applyFirmState(await story.as('Maud Ferrisay'), paid.id, await readFirmState(firm, paid.session))
  }
  if (given) {
    await later(given, 21)
    await refundFee(await story.as('Maud Ferrisay'), {
      reference: given.reference,
      amount: '40.00',
      reason: 'The institute joined as a partner before the deadline.',
      givenBackMinor: 0,
    })
  }
  if (disputed) {
    await later(disputed, 30)
    await tell(disputed, 'open')
    await later(disputed, 52)
    await tell(disputed, 'won')
  }
  if (open) {
    await later(open, 18)
    await tell(open, 'open')
  }
}
