import { closeDispute, insertDispute, lockDispute } from '@/db/queries/disputes'
import { lockFee } from '@/db/queries/fees'
import { isMoved, moveMoney } from '@/db/queries/moneyLedger'
import { officePeople } from '@/db/queries/roleHolders'
import type { FeesRow, PaymentsRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import type { DisputeState } from '@/lib/services/payments/Payments'
import type { Context } from '../context'
import { writeLogbook } from '../logbook/writeLogbook'
import { disputeTold } from '../outbox/letters/disputeTold'
import { queueLetter } from '../outbox/queueLetter'
import { readContents } from '../proposals/readContents'
import { wonAfterAll } from './wonAfterAll'

/**
 * Brings the disputes about a payment to what the firm says of them: opened, the amount is set apart; won, it comes
 * back; lost, it is gone. An end that arrives before its beginning is applied as both.
 */
export async function applyDisputes(
  tx: Context,
  payment: PaymentsRow,
  states: readonly DisputeState[],
): Promise<string[]> {
  const effects: string[] = []
  if (states.length === 0) return effects
  const fee = await lockFee(tx.db, payment.fee_id)
  if (!fee) throw refuse.integrity('The fee of this dispute is missing.')
  for (const state of states) {
    const known = await lockDispute(tx.db, state.disputeId)
    const id = known?.id ?? (await open(tx, fee, payment, state))
    const before = known?.state ?? 'open'
    const isEnd = before === 'open' ? state.status !== 'open' : before === 'lost' && state.status === 'won'
    if (isEnd && known?.decision && known.decision !== 'accept') await wonAfterAll(tx, fee, known)
    else if (isEnd) await end(tx, fee, id, before, state)
    await chargeForIt(tx, fee, id, state)
    if (known && !isEnd) continue
    await tell(tx, fee, state, id)
    effects.push(`dispute ${state.status}`)
  }
  return effects
}

async function open(tx: Context, fee: FeesRow, payment: PaymentsRow, state: DisputeState): Promise<number> {
  const id = await insertDispute(tx.db, {
    paymentId: payment.id,
    providerDisputeId: state.disputeId,
    amountMinor: state.amountMinor,
    reason: state.reason,
  })
  await moveMoney(tx.db, {
    movement: `disputed:${id}`,
    feeId: fee.id,
    from: 'provider',
    to: 'disputed',
    amountMinor: state.amountMinor,
    currency: fee.currency,
  })
  return id
}

/** A bank may change its mind once after an appeal, so the money may come back from what was lost. */
async function end(
  tx: Context,
  fee: FeesRow,
  id: number,
  before: 'open' | 'won' | 'lost',
  state: DisputeState,
): Promise<void> {
  const status = state.status === 'won' ? 'won' : 'lost'
  await closeDispute(tx.db, id, status)
  const held = { open: 'disputed', won: 'provider', lost: 'lost' } as const
  await moveMoney(tx.db, {
    movement: `dispute-${status}:${id}`,
    feeId: fee.id,
    from: held[before],
    to: status === 'won' ? 'provider' : 'lost',
    amountMinor: state.amountMinor,
    currency: fee.currency,
  })
}

async function chargeForIt(tx: Context, fee: FeesRow, id: number, state: DisputeState): Promise<void> {
  const movement = `dispute-charge:${id}`
  if (!state.firmFeeMinor || (await isMoved(tx.db, movement))) return
  await moveMoney(tx.db, {
    movement,
    feeId: fee.id,
    from: 'provider',
    to: 'firm-fees',
    amountMinor: state.firmFeeMinor,
    currency: fee.currency,
  })
}

async function tell(tx: Context, fee: FeesRow, state: DisputeState, id: number): Promise<void> {
  const { reference } = await readContents(tx.db, fee.proposal_id)
  const facts = { reference, amountMinor: state.amountMinor, currency: fee.currency, status: state.status }
  for (const person of await officePeople(tx.db)) {
    const letter = disputeTold({ name: person.name, ...facts, origin: tx.request.origin })
    await queueLetter(tx, person, letter, `dispute-${state.status}:${id}`)
  }
  await writeLogbook(tx, {
    action: 'fee.dispute',
    subject: { kind: 'proposal', id: reference },
    actingAs: 'payment firm',
    after: { state: state.status, amountMinor: state.amountMinor, reason: state.reason },
  })
}
