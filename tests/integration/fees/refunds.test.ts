import { beforeEach, describe, expect, it } from 'vitest'
import { confirmPayment } from '@/lib/domain/fees/confirmPayment'
import { reconcilePayments } from '@/lib/domain/fees/reconcilePayments'
import { refundFee } from '@/lib/domain/fees/refundFee'
import { startPayment } from '@/lib/domain/fees/startPayment'
import { makeBilled, type Billed } from '../../support/billed'
import { useRolledBackDatabase } from '../../support/database'
import { firmFeeOf } from '../../support/fakePayments'
import { moneyOf } from '../../support/moneyOf'
import { deliver, noticeOf } from '../../support/notices'

const db = useRolledBackDatabase()
let billed: Billed
let session: string
const refund = (amount: string, givenBackMinor = 0, who: 'office' | 'pi' = 'office') =>
  refundFee(billed.as(billed.scenario[who]), {
    reference: billed.scenario.reference,
    amount,
    reason: 'The instrument was taken off the call.',
    givenBackMinor,
  })
const books = () => moneyOf(db(), billed.scenario.proposalId)
const creditNotes = () => db()('credit_notes').orderBy('id')

beforeEach(async () => {
  billed = await makeBilled(db())
  session = await billed.open()
  billed.payments.pay(session)
  await confirmPayment(billed.ctx, { reference: billed.scenario.reference })
})

// Seen to fail with the sum of refunds left out of what is left, with the guard by what was given back left out, and with
// the credit note written at the decision.
describe('giving back a fee', () => {
  it('in part keeps it paid, with a credit note over the part', async () => {
    await refund('50.00')
    expect(await billed.rows()).toMatchObject({ fee: 'paid', refunds: ['succeeded'] })
    expect(await books()).toEqual({
      income: -12_000,
      refunds: 5_000,
      provider: 7_000 - firmFeeOf(12_000),
      'firm-fees': firmFeeOf(12_000),
    })
    const [note] = await creditNotes()
    expect(note).toMatchObject({ amount_minor: 5_000, invoice_id: null })
    expect(note?.number).toMatch(/^QC-\d{4}-\d{4}$/)
    const letter = await db()('outbox').where({ template: 'credit-note' }).first()
    expect(letter).toMatchObject({ attachment: note?.number, to_email: billed.scenario.pi.email })
  })

  it('in two parts makes it given back, and no more', async () => {
    await refund('50')
    await refund('70.00', 5_000)
    expect(await billed.rows()).toMatchObject({ fee: 'refunded', refunds: ['succeeded', 'succeeded'] })
    await expect(refund('1', 12_000)).rejects.toThrow('given back already')
    expect([...billed.payments.refunds.values()].map(({ amountMinor }) => amountMinor)).toEqual([
      5_000, 7_000,
    ])
  })

  it.each([
    ['120.01', 'At most EUR\u00A0120.00'],
    ['0', 'above zero'],
    ['-5', 'never negative'],
    ['1.005', 'two decimals'],
    ['USD 5', 'not in USD'],
    ['five', 'in figures'],
    ['1e3', 'in figures'],
  ])('refuses %s in words and changes nothing', async (amount, words) => {
    await expect(refund(amount)).rejects.toThrow(words)
    expect(await billed.rows()).toMatchObject({ fee: 'paid', refunds: [] })
  })

  it('is refused to whoever has not seen the last refund', async () => {
    await refund('50')
    await expect(refund('50')).rejects.toThrow('EUR\u00A050.00 stands as given back')
  })

  it('is for the office alone', async () => {
    await expect(refund('50', 0, 'pi')).rejects.toMatchObject({ kind: 'not-found' })
  })

  it('that fails leaves the fee paid and tells the office', async () => {
    billed.payments.refundsTurn = 'failed'
    await refund('120')
    expect(await billed.rows()).toMatchObject({ fee: 'paid', refunds: ['failed'] })
    expect(await creditNotes()).toEqual([])
    expect((await db()('outbox').where({ template: 'refund-failed' })).length).toBe(1)
    billed.payments.refundsTurn = 'succeeded'
    await refund('120')
    expect(await billed.rows()).toMatchObject({ fee: 'refunded', refunds: ['failed', 'succeeded'] })
  })

  it('that is under way is looked up later, not asked for again', async () => {
    billed.payments.refundsTurn = 'pending'
    await refund('120')
    expect(await billed.rows()).toMatchObject({ fee: 'refunded', refunds: ['created'] })
    for (const made of billed.payments.refunds.values()) made.status = 'succeeded'
    expect(await reconcilePayments({ ...billed.ctx, actor: null })).toMatchObject({ refunded: 1 })
    expect(await billed.rows()).toMatchObject({ refunds: ['succeeded'] })
    expect(billed.payments.refunds.size).toBe(1)
  })

  it('made by hand at the firm is taken into the books, once', async () => {
    billed.payments.refundByHand(session, 4_000)
    const notice = () => noticeOf(session, { type: 'charge.refunded' })
    expect(await deliver(billed.ctx, notice())).toContain('taken in')
    expect(await deliver(billed.ctx, notice())).toBe('nothing: it was settled before')
    expect(await billed.rows()).toMatchObject({ fee: 'paid', refunds: ['succeeded'] })
    expect(await books()).toMatchObject({ refunds: 4_000 })
    await expect(refund('120', 4_000)).rejects.toThrow('At most EUR\u00A080.00')
  })
})

describe('money that came twice', () => {
  it('goes back whole and leaves the fee as it is', async () => {
    const other = await makeBilled(db())
    const first = await other.open()
    await db()('payments').where({ provider_session_id: first }).update({ state: 'expired' })
    await startPayment(other.ctx, { reference: other.scenario.reference })
    const [, second = ''] = [...other.payments.sessions.keys()]
    for (const id of [first, second]) {
      other.payments.pay(id)
      await deliver(other.ctx, noticeOf(id))
    }
    await reconcilePayments({ ...other.ctx, actor: null })
    expect(await other.rows()).toMatchObject({ fee: 'paid', receipts: 2, refunds: ['succeeded'] })
    expect(await moneyOf(db(), other.scenario.proposalId)).toMatchObject({ income: -12_000 })
    expect((await moneyOf(db(), other.scenario.proposalId)).refunds).toBeUndefined()
  })
})

describe('a dispute', () => {
  const told = (status: 'open' | 'won' | 'lost') => {
    billed.payments.dispute(session, status)
    const type = status === 'open' ? 'charge.dispute.created' : 'charge.dispute.closed'
    return deliver(billed.ctx, noticeOf(session, { type }))
  }

  it('sets the amount apart, tells the office and holds refunds', async () => {
    expect(await told('open')).toBe('dispute open')
    expect(await books()).toEqual({
      income: -12_000,
      disputed: 12_000,
      provider: -firmFeeOf(12_000) - 2_000,
      'firm-fees': firmFeeOf(12_000) + 2_000,
    })
    expect((await db()('outbox').where({ template: 'fee-dispute' })).length).toBe(1)
    await expect(refund('10')).rejects.toThrow('disputes this payment')
  })

  it.each([
    ['won', { provider: 12_000 - firmFeeOf(12_000) - 2_000 }],
    ['lost', { lost: 12_000 }],
  ] as const)('that is %s closes once, whichever notice comes first', async (status, expected) => {
    await told('open')
    expect(await told(status)).toBe(`dispute ${status}`)
    expect(await told(status)).toBe('nothing: it was settled before')
    expect(await books()).toMatchObject(expected)
    expect((await books()).disputed).toBeUndefined()
  })

  it('whose end arrives before its beginning is applied as both', async () => {
    expect(await told('lost')).toBe('dispute lost')
    expect(await deliver(billed.ctx, noticeOf(session, { type: 'charge.dispute.created' }))).toBe(
      'nothing: it was settled before',
    )
    expect(await books()).toMatchObject({ lost: 12_000 })
    expect(await db()('disputes')).toHaveLength(1)
  })
})
