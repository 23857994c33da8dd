import { beforeEach, describe, expect, it } from 'vitest'
import { confirmPayment } from '@/lib/domain/fees/confirmPayment'
import { mendDifferences } from '@/lib/domain/fees/mendDifferences'
import { readFee } from '@/lib/domain/fees/readFee'
import { readLedger } from '@/lib/domain/fees/readLedger'
import { readReconciliation } from '@/lib/domain/fees/readReconciliation'
import { refundFee } from '@/lib/domain/fees/refundFee'
import { refuse } from '@/lib/errors'
import { makeBilled, type Billed } from '../../support/billed'
import { useRolledBackDatabase } from '../../support/database'
import { deliver, noticeOf } from '../../support/notices'

const db = useRolledBackDatabase()
let billed: Billed
let session: string
const office = () => billed.as(billed.scenario.office)
const mend = () => mendDifferences({ ...billed.ctx, actor: null })
const view = () => readReconciliation(office())

beforeEach(async () => {
  billed = await makeBilled(db())
  session = await billed.open()
})

// Seen to fail with the difference put on record at every run.
describe('the books against the firm’s list', () => {
  it('shows what differs, mends it and keeps what was mended on record', async () => {
    billed.payments.pay(session)
    billed.payments.refundByHand(session, 2_000)
    expect((await view()).now?.differences).toMatchObject([
      { reference: billed.scenario.reference, ours: 'not paid', isMendable: true },
    ])
    expect(await mend()).toEqual({ payments: 1, found: 1, mended: 1 })
    expect(await billed.rows()).toMatchObject({ fee: 'paid', refunds: ['succeeded'] })
    const { now, past } = await view()
    expect(now?.differences).toEqual([])
    expect(past).toMatchObject([{ reference: billed.scenario.reference, ours: 'not paid', who: null }])
    expect(past[0]?.repaired).toContain('fee paid')
    expect(await mend()).toEqual({ payments: 1, found: 0, mended: 0 })
  })

  it('puts what only people can clear on record once', async () => {
    billed.payments.pay(session)
    const paid = billed.payments.sessions.get(session)
    if (paid) billed.payments.sessions.set(session, { ...paid, amountMinor: 1 })
    expect(await mend()).toEqual({ payments: 1, found: 1, mended: 0 })
    expect(await mend()).toEqual({ payments: 1, found: 1, mended: 0 })
    expect((await view()).past).toMatchObject([{ repaired: '' }])
  })

  it('says that the firm does not answer', async () => {
    const listPayments = () => Promise.reject(refuse.unavailable('payment firm'))
    const ctx = { ...office(), payments: { ...billed.payments, listPayments } }
    expect((await readReconciliation(ctx)).now).toBeNull()
  })

  it('is for the office alone', async () => {
    await expect(readReconciliation(billed.ctx)).rejects.toMatchObject({ kind: 'not-found' })
    await expect(mendDifferences(billed.ctx)).rejects.toMatchObject({ kind: 'not-found' })
    await expect(readLedger(billed.ctx)).rejects.toMatchObject({ kind: 'not-found' })
    await expect(readFee(billed.ctx, billed.scenario.reference)).rejects.toMatchObject({ kind: 'not-found' })
  })
})

describe('the ledger', () => {
  it('tells each movement with both sides, and every sum of a fee', async () => {
    billed.payments.pay(session)
    await confirmPayment(billed.ctx, { reference: billed.scenario.reference })
    await refundFee(office(), {
      reference: billed.scenario.reference,
      amount: '20',
      reason: 'Half a night was lost.',
      givenBackMinor: 0,
    })
    const { fees, movements, check } = await readLedger(office())
    expect(check).toEqual({ movements: 5, unbalanced: 0 })
    expect(fees).toMatchObject([
      {
        reference: billed.scenario.reference,
        state: 'paid',
        billedMinor: 12_000,
        paidMinor: 12_000,
        givenBackMinor: 2_000,
        owedMinor: 0,
        droppedMinor: 0,
        waivedMinor: 0,
      },
    ])
    expect(movements.map(({ from, to, amountMinor }) => [from, to, amountMinor])).toEqual(
      expect.arrayContaining([
        ['income', 'receivable', 12_000],
        ['receivable', 'provider', 12_000],
        ['owed-back', 'refunds', 2_000],
        ['provider', 'owed-back', 2_000],
      ]),
    )
  })
})

describe('the timeline of a fee', () => {
  it('tells everything in order, with who did it', async () => {
    await deliver(
      billed.ctx,
      noticeOf(session, {
        type: 'payment_intent.payment_failed',
        failure: 'Your card was declined.',
        body: JSON.stringify({
          data: { object: { last_payment_error: { message: 'Your card has insufficient funds.' } } },
        }),
      }),
    )
    billed.payments.pay(session)
    await deliver(billed.ctx, noticeOf(session))
    await refundFee(office(), {
      reference: billed.scenario.reference,
      amount: '20',
      reason: 'Half a night was lost.',
      givenBackMinor: 0,
    })
    const { events, refundableMinor, givenBackMinor } = await readFee(office(), billed.scenario.reference)
    expect({ refundableMinor, givenBackMinor }).toEqual({ refundableMinor: 10_000, givenBackMinor: 2_000 })
    const told = events.map(({ words, who }) => `${words.replaceAll('\u00A0', ' ')} / ${who ?? '-'}`)
    const { pi, office: maud } = billed.scenario
    for (const line of [
      `Proposal sent / ${pi.name}`,
      `Payment started on the firm’s page / ${pi.name}`,
      'Card refused by the bank: Your card has insufficient funds. / -',
      `Refund of EUR 20.00 decided: Half a night was lost. / ${maud.name}`,
    ])
      expect(told).toContain(line)
    expect(told.some((line) => /^EUR 120\.00 paid; receipt QR-\d{4}-\d{4} \/ -$/.test(line))).toBe(true)
    expect(told.some((line) => /^EUR 20\.00 given back; credit note QC-\d{4}-\d{4} \/ -$/.test(line))).toBe(
      true,
    )
    expect(events.map(({ at }) => at.getTime())).toEqual(
      events.map(({ at }) => at.getTime()).sort((a, b) => a - b),
    )
  })
})
