import { beforeEach, describe, expect, it } from 'vitest'
import { deliver, noticeOf } from '../../support/notices'
import { makeBilled, type Billed } from '../../support/billed'
import { useRolledBackDatabase } from '../../support/database'

const db = useRolledBackDatabase()
let billed: Billed
let session: string

beforeEach(async () => {
  billed = await makeBilled(db())
  session = await billed.open()
})

/** Numbers in a fixed order that looks like none. */
function shuffled<T>(items: readonly T[], seed: number): T[] {
  let state = seed
  const next = () => (state = (state * 1_103_515_245 + 12_345) % 2_147_483_648)
  return items
    .map((item) => ({ item, at: next() }))
    .sort((a, b) => a.at - b.at)
    .map(({ item }) => item)
}

// Seen to fail with the notice believed instead of the session, and with known events not looked for.
describe('a notice of the payment firm', () => {
  it('settles the fee, and the same one again does nothing', async () => {
    billed.payments.pay(session)
    const notice = noticeOf(session)
    expect(await deliver(billed.ctx, notice)).toMatch(/^fee paid, receipt QR-/)
    expect(await deliver(billed.ctx, notice)).toBe('known before')
    expect(await billed.rows()).toMatchObject({ fee: 'paid', payments: ['succeeded'], receipts: 1 })
  })

  it('is refused with a wrong signature, and leaves no trace', async () => {
    billed.payments.pay(session)
    await expect(deliver(billed.ctx, noticeOf(session), 'bad')).rejects.toMatchObject({ kind: 'invalid' })
    expect(await billed.rows()).toMatchObject({ fee: 'due', payments: ['open'], receipts: 0 })
    expect(await db()('payment_events').where({ payment_id: null })).toEqual([])
  })

  it('is not believed: only the session at the firm is', async () => {
    expect(await deliver(billed.ctx, noticeOf(session))).toBe('nothing: it is still open')
    expect(await billed.rows()).toMatchObject({ fee: 'due', receipts: 0 })
  })

  it('that speaks of no payment of ours is kept and left alone', async () => {
    expect(await deliver(billed.ctx, noticeOf('cs_of_someone_else'))).toBe(
      'nothing: it speaks of no payment of ours',
    )
    expect(await billed.rows()).toMatchObject({ fee: 'due' })
  })

  it('keeps why a card was refused', async () => {
    const declined = noticeOf(session, {
      type: 'payment_intent.payment_failed',
      failure: 'Your card was declined.',
    })
    await deliver(billed.ctx, declined)
    const row = await db()('payments').where({ provider_session_id: session }).first()
    expect(row).toMatchObject({ state: 'open', failure: 'Your card was declined.' })
  })

  it('comes to one end in each of 40 orders, with doubles', async () => {
    billed.payments.pay(session)
    const notices = [
      noticeOf(session),
      noticeOf(session, { type: 'payment_intent.payment_failed', failure: 'Your card was declined.' }),
      noticeOf(session, { type: 'payment_intent.succeeded' }),
      noticeOf(session, { type: 'charge.updated' }),
    ]
    for (let seed = 1; seed <= 40; seed += 1)
      for (const notice of shuffled([...notices, ...notices], seed)) await deliver(billed.ctx, notice)
    expect(await billed.rows()).toMatchObject({
      fee: 'paid',
      payments: ['succeeded'],
      receipts: 1,
      refunds: [],
    })
  })
})
