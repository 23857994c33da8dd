import { beforeEach, describe, expect, it } from 'vitest'
import { confirmPayment } from '@/lib/domain/fees/confirmPayment'
import { reconcilePayments } from '@/lib/domain/fees/reconcilePayments'
import { startPayment } from '@/lib/domain/fees/startPayment'
import { withdrawProposal } from '@/lib/domain/submission/withdrawProposal'
import { makeBilled, type Billed } from '../../support/billed'
import { useRolledBackDatabase } from '../../support/database'
import { withFault } from '../../support/stepFault'

const db = useRolledBackDatabase()
let billed: Billed
const start = () => startPayment(billed.ctx, { reference: billed.scenario.reference })
const confirm = () => confirmPayment(billed.ctx, { reference: billed.scenario.reference })
const withdraw = () =>
  withdrawProposal(billed.ctx, {
    reference: billed.scenario.reference,
    reason: 'The object has faded.',
    arrivedAt: new Date(),
  })

beforeEach(async () => {
  billed = await makeBilled(db())
})

// Seen to fail with a new session for every press, and with the amount taken from the session.
describe('paying a fee', () => {
  it('opens one page of the firm, for the amount of the call, and the same again', async () => {
    const first = await start()
    expect(await start()).toEqual(first)
    const [session] = [...billed.payments.sessions.values()]
    expect(session).toMatchObject({ amountMinor: 12_000, currency: 'EUR', status: 'open' })
    expect(billed.payments.sessions.size).toBe(1)
  })

  it('settles it once, with one receipt, however often the person comes back', async () => {
    billed.payments.pay(await billed.open())
    await confirm()
    await confirm()
    expect(await billed.rows()).toMatchObject({
      fee: 'paid',
      payments: ['succeeded'],
      receipts: 1,
      refunds: [],
    })
  })

  it('is settled by the job when neither person nor notice comes back', async () => {
    billed.payments.pay(await billed.open())
    expect(await reconcilePayments({ ...billed.ctx, actor: null })).toMatchObject({
      settled: 1,
      unanswered: 0,
    })
    expect(await billed.rows()).toMatchObject({ fee: 'paid', receipts: 1 })
  })

  it('begins anew when the page has expired', async () => {
    const old = await billed.open()
    billed.payments.expire(old)
    const { url } = await start()
    expect(url).not.toContain(old)
    expect(await billed.rows()).toMatchObject({ fee: 'due', payments: ['expired', 'open'] })
  })

  it.each([
    ['another amount', { amountMinor: 1 }],
    ['more', { amountMinor: 12_001 }],
    ['another currency', { currency: 'USD' }],
  ])('does not take %s for the fee', async (_, over) => {
    const id = await billed.open()
    billed.payments.pay(id)
    const session = billed.payments.sessions.get(id)
    if (session) billed.payments.sessions.set(id, { ...session, ...over })
    await confirm()
    expect(await billed.rows()).toMatchObject({ fee: 'due', payments: ['open'], receipts: 0 })
  })

  it('says that the firm does not answer, and asks by the same key afterwards', async () => {
    const steps = (await withFault(0, 'once', start)).steps
    const other = await makeBilled(db())
    const again = () => startPayment(other.ctx, { reference: other.scenario.reference })
    const number = steps.indexOf('payments:create-checkout') + 1
    expect((await withFault(number, 'answer lost', again)).error).toMatchObject({ kind: 'unavailable' })
    await again()
    expect(other.payments.sessions.size).toBe(1)
    expect(await other.rows()).toMatchObject({ fee: 'due', payments: ['open'] })
  })

  it.each([
    ['a stranger', 'stranger', 'not-found'],
    ['the office', 'office', 'forbidden'],
  ] as const)('is not for %s', async (_, who, kind) => {
    const other = billed.as(billed.scenario[who])
    await expect(startPayment(other, { reference: billed.scenario.reference })).rejects.toMatchObject({
      kind,
    })
  })
})

describe('withdrawing a paid proposal', () => {
  it('gives back in full what was paid, once', async () => {
    billed.payments.pay(await billed.open())
    await confirm()
    expect(await withdraw()).toEqual({ fee: 'refunded' })
    expect([...billed.payments.refunds.values()].map(({ amountMinor }) => amountMinor)).toEqual([12_000])
    expect(await billed.rows()).toMatchObject({ fee: 'refunded', refunds: ['succeeded'] })
  })

  it('stands though the firm does not answer; the job gives the money back', async () => {
    billed.payments.pay(await billed.open())
    await confirm()
    const ctx = {
      ...billed.ctx,
      payments: { ...billed.payments, refund: () => Promise.reject(new Error('down')) },
    }
    const { reference } = billed.scenario
    expect(
      await withdrawProposal(ctx, { reference, reason: 'The object has faded.', arrivedAt: new Date() }),
    ).toEqual({ fee: 'refunded' })
    expect(await billed.rows()).toMatchObject({ fee: 'refunded', refunds: ['created'] })
    expect(await reconcilePayments({ ...billed.ctx, actor: null })).toMatchObject({ refunded: 1 })
    expect(await billed.rows()).toMatchObject({ refunds: ['succeeded'] })
  })

  it('sends back money that arrives afterwards', async () => {
    const id = await billed.open()
    await withdraw()
    billed.payments.pay(id)
    await reconcilePayments({ ...billed.ctx, actor: null })
    expect(await billed.rows()).toMatchObject({ fee: 'cancelled', receipts: 1, refunds: ['succeeded'] })
  })
})
