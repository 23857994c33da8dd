import { describe, expect, it } from 'vitest'
import { carryOutRefunds } from '@/lib/domain/fees/carryOutRefunds'
import { refundFee } from '@/lib/domain/fees/refundFee'
import { startPayment } from '@/lib/domain/fees/startPayment'
import { Refusal } from '@/lib/errors'
import { makeBilled, type Billed } from '../../support/billed'
import { checkInvariants } from '../../support/invariants'
import { moneyOf } from '../../support/moneyOf'
import { deliver, noticeOf } from '../../support/notices'
import { useOwnDatabase } from '../../support/ownDatabase'
import { withFault, type FaultMode } from '../../support/stepFault'

const db = useOwnDatabase('pay_faults')

/** One press of somebody, as it can be made again. */
interface Press {
  ready: () => Promise<Billed>
  press: (billed: Billed) => Promise<unknown>
}

const opened = async () => {
  const billed = await makeBilled(db())
  await billed.open()
  return billed
}

const paid = async () => {
  const billed = await opened()
  await arrive(billed)
  return billed
}

const sessionOf = ({ payments }: Billed) => [...payments.sessions.keys()][0] ?? ''

/** The firm has the money and sends its notice: the same one at every try. */
async function arrive(billed: Billed): Promise<void> {
  const session = sessionOf(billed)
  if (!billed.payments.sessions.get(session)?.isPaid) billed.payments.pay(session)
  await deliver(billed.ctx, noticeOf(session, { id: `evt_${session}` }))
}

/** Presses again until it stands: whoever is told that it was given back already is content. */
async function giveBack(billed: Billed): Promise<void> {
  try {
    await refundFee(billed.as(billed.scenario.office), {
      reference: billed.scenario.reference,
      amount: '50.00',
      reason: 'Half a night was lost.',
      givenBackMinor: 0,
    })
  } catch (error) {
    const isDone = error instanceof Refusal && error.message.includes('stands as given back')
    if (!isDone) throw error
  }
  await carryOutRefunds({ ...billed.ctx, actor: null })
}

const presses: Record<string, Press> = {
  'opening the firm’s page': {
    ready: () => makeBilled(db()),
    press: (billed) => startPayment(billed.ctx, { reference: billed.scenario.reference }),
  },
  'the notice that it was paid': { ready: opened, press: arrive },
  'giving a part back': { ready: paid, press: giveBack },
}

/** What is left behind, counted on both sides. */
async function traces(billed: Billed) {
  const { payments, scenario } = billed
  const { fee, payments: attempts, receipts, refunds } = await billed.rows()
  const feeRow = await db()('fees').where({ proposal_id: scenario.proposalId }).first()
  const notes = await db()('credit_notes').where({ fee_id: feeRow?.id ?? 0 })
  const letters = await db()('outbox')
    .whereIn('template', ['fee-receipt', 'credit-note'])
    .andWhere('subject', 'like', `%${scenario.reference}`)
  return {
    fee,
    attempts,
    receipts,
    refunds,
    creditNotes: notes.length,
    letters: letters.length,
    pagesAtFirm: payments.sessions.size,
    refundsAtFirm: [...payments.refunds.values()].map(({ amountMinor }) => amountMinor),
    books: await moneyOf(db(), scenario.proposalId),
  }
}

/** Runs with one step made to fail, looks, and presses again. */
async function disturbed({ ready, press }: Press, number: number, mode: FaultMode) {
  const billed = await ready()
  await withFault(number, mode, () => press(billed))
  await checkInvariants(db())
  await press(billed)
  return traces(billed)
}

// Seen to fail with a step of settling that fails passed over.
describe.each(Object.entries(presses))('%s, with each step made to fail in turn', (_, one) => {
  it.each<FaultMode>(['once', 'for good', 'answer lost'])(
    'keeps every promise, and the next press makes it whole, once: %s',
    async (mode) => {
      const billed = await one.ready()
      const whole = await withFault(0, 'once', () => one.press(billed))
      expect(whole.error).toBeNull()
      expect(whole.steps.length).toBeGreaterThan(8)
      const expected = await traces(billed)
      for (const [index, step] of whole.steps.entries())
        expect({ step, left: await disturbed(one, index + 1, mode) }).toEqual({ step, left: expected })
    },
    300_000,
  )
})
