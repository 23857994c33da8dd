import { beforeEach, describe, expect, it } from 'vitest'
import { confirmPayment } from '@/lib/domain/fees/confirmPayment'
import { decideDispute } from '@/lib/domain/fees/decideDispute'
import { lapseFees } from '@/lib/domain/fees/lapseFees'
import { readFee } from '@/lib/domain/fees/readFee'
import { readUndecided } from '@/lib/domain/fees/readUndecided'
import { reconcilePayments } from '@/lib/domain/fees/reconcilePayments'
import { remindByClock } from '@/lib/domain/fees/remindOwing'
import { refundFee } from '@/lib/domain/fees/refundFee'
import { decideDisputeSchema } from '@/lib/domain/fees/schema'
import { makeBilled, type Billed } from '../../support/billed'
import { useRolledBackDatabase } from '../../support/database'
import { firmFeeOf } from '../../support/fakePayments'
import { moneyOf } from '../../support/moneyOf'
import { deliver, noticeOf } from '../../support/notices'
import { refused } from '../../support/refused'

const db = useRolledBackDatabase()
let billed: Billed
let session: string
const office = () => billed.as(billed.scenario.office)
const reference = () => billed.scenario.reference
const books = () => moneyOf(db(), billed.scenario.proposalId)
const charges = (payments = 1) => payments * firmFeeOf(12_000) + 2_000
const told = (status: 'open' | 'won' | 'lost', amountMinor = 12_000) => {
  billed.payments.dispute(session, status, amountMinor)
  const type = status === 'open' ? 'charge.dispute.created' : 'charge.dispute.closed'
  return deliver(billed.ctx, noticeOf(session, { type }))
}
const pay = async () => {
  const next = await billed.open()
  billed.payments.pay(next)
  await confirmPayment(billed.ctx, { reference: reference() })
}
const decide = async (decision: 'ask-again' | 'waive' | 'withdraw' | 'accept', over = {}) => {
  const dispute = await db()('disputes').orderBy('id', 'desc').first()
  const typed = {
    disputeId: dispute?.id ?? 0,
    decision,
    graceDays: '10',
    note: 'The card was stolen.',
    ...over,
  }
  await decideDispute(office(), decideDisputeSchema.parse(typed))
}
const letters = async () =>
  (await db()('outbox').where({ template: 'dispute-decided' }).orderBy('id')).map(
    ({ to_email, text_body }) => ({
      to_email,
      text_body,
    }),
  )

beforeEach(async () => {
  billed = await makeBilled(db())
  session = await billed.open()
  billed.payments.pay(session)
  await confirmPayment(billed.ctx, { reference: reference() })
})

// Seen to fail: with the loss left in its account.
describe('a lost dispute', () => {
  it('waits for the office, with what can be made of it, until it is decided', async () => {
    await told('open')
    expect(await readUndecided(office())).toEqual([])
    await told('lost')
    expect(await readUndecided(office())).toMatchObject([
      { reference: reference(), amountMinor: 12_000, currency: 'EUR' },
    ])
    expect((await readFee(office(), reference())).lostDispute).toMatchObject({
      amountMinor: 12_000,
      choices: ['ask-again', 'waive', 'withdraw'],
    })
    await decide('waive')
    expect(await readUndecided(office())).toEqual([])
    const fee = await readFee(office(), reference())
    expect(fee.lostDispute).toBeNull()
    expect(fee.events.some(({ words }) => words.startsWith('Lost dispute: the fee is waived, '))).toBe(true)
    expect((await refused(decide('withdraw'))).kind).toBe('closed')
    expect((await refused(readUndecided(billed.as(billed.scenario.chair)))).kind).toBe('not-found')
  })

  it('asks for the fee again, for as long as the office says; paid again, it is paid once', async () => {
    await told('lost')
    await decide('ask-again')
    expect(await books()).toEqual({
      income: -12_000,
      receivable: 12_000,
      provider: -charges(),
      'firm-fees': charges(),
    })
    const fee = await db()('fees').where({ proposal_id: billed.scenario.proposalId }).first()
    expect(fee?.state).toBe('due')
    const days = ((fee?.due_at.getTime() ?? 0) - Date.now()) / 86_400_000
    expect(days).toBeGreaterThan(9.9)
    expect(days).toBeLessThan(10.1)
    // A deadline long past is no reason to remind at once of what was asked for a moment ago.
    await db()('calls')
      .where({ id: billed.scenario.callId })
      .update({ closes_at: new Date(Date.now() - 10 * 86_400_000) })
    expect(await remindByClock({ ...billed.ctx, actor: null })).toBe(0)
    const [letter] = await letters()
    expect(letter?.to_email).toBe(billed.scenario.pi.email)
    expect(letter?.text_body).toContain('The office writes: The card was stolen.')
    expect((await readFee(office(), reference())).refundableMinor).toBe(0)

    await pay()
    expect(await billed.rows()).toMatchObject({
      fee: 'paid',
      payments: ['succeeded', 'succeeded'],
      receipts: 2,
    })
    expect(await books()).toEqual({
      income: -12_000,
      provider: 12_000 - charges(2),
      'firm-fees': charges(2),
    })
    await refundFee(office(), {
      reference: reference(),
      amount: '120',
      reason: 'No night.',
      givenBackMinor: 0,
    })
    expect((await billed.rows()).fee).toBe('refunded')
  })

  it('lets the proposal lapse when the fee that was asked for again is not settled', async () => {
    await told('lost')
    await decide('ask-again')
    await db()('fees')
      .where({ proposal_id: billed.scenario.proposalId })
      .update({ due_at: new Date(0) })
    expect(await lapseFees({ ...billed.ctx, actor: null })).toBe(1)
    expect((await billed.rows()).fee).toBe('lapsed')
    expect(await books()).toEqual({ provider: -charges(), 'firm-fees': charges() })
  })

  it('is waived: the proposal stays in, and the books call the fee waived', async () => {
    await told('lost')
    await decide('waive')
    expect((await billed.rows()).fee).toBe('waived')
    expect(await books()).toMatchObject({ income: -12_000, waived: 12_000 })
    expect((await books()).lost).toBeUndefined()
    const proposal = await db()('proposals').where({ id: billed.scenario.proposalId }).first()
    expect(proposal?.state).toBe('submitted')
  })

  it('takes the proposal out with its fee, and tells everybody on it', async () => {
    await told('lost')
    await decide('withdraw')
    expect((await billed.rows()).fee).toBe('cancelled')
    expect(await books()).toEqual({ provider: -charges(), 'firm-fees': charges() })
    const proposal = await db()('proposals').where({ id: billed.scenario.proposalId }).first()
    expect(proposal).toMatchObject({ state: 'withdrawn', withdrawn_reason: 'The card was stolen.' })
    expect((await letters()).length).toBeGreaterThan(1)
  })

  it('over part of a fee is a loss to be taken, and nobody is written to', async () => {
    await refundFee(office(), {
      reference: reference(),
      amount: '50',
      reason: 'Half a night.',
      givenBackMinor: 0,
    })
    await told('lost', 7_000)
    expect((await readFee(office(), reference())).lostDispute?.choices).toEqual(['accept'])
    expect((await refused(decide('ask-again'))).message).toMatch(/cannot be done about this fee/)
    await decide('accept')
    expect((await billed.rows()).fee).toBe('paid')
    expect(await books()).toMatchObject({ lost: 7_000 })
    expect(await letters()).toEqual([])
  })
})

describe('a dispute that is won after it was decided', () => {
  it('settles the fee that was asked for again', async () => {
    await told('lost')
    await decide('ask-again')
    expect(await told('won')).toBe('dispute won')
    expect((await billed.rows()).fee).toBe('paid')
    expect(await books()).toMatchObject({ income: -12_000, provider: 12_000 - charges() })
  })

  it.each(['paid again', 'waived'] as const)('goes back where the fee is %s', async (what) => {
    await told('lost')
    await decide(what === 'waived' ? 'waive' : 'ask-again')
    if (what === 'paid again') await pay()
    await told('won')
    await reconcilePayments({ ...billed.ctx, actor: null })
    expect(await billed.rows()).toMatchObject({
      fee: what === 'waived' ? 'waived' : 'paid',
      refunds: ['succeeded'],
    })
    expect((await books())['owed-back']).toBeUndefined()
  })
})

it('wants a reason, and days of grace in reason', () => {
  const typed = { disputeId: 1, decision: 'ask-again', graceDays: '14', note: 'Why.' }
  const wrong = (over: object) =>
    decideDisputeSchema.safeParse({ ...typed, ...over }).error?.issues.map(({ message }) => message)
  expect(wrong({ graceDays: '0' })).toEqual(['Between 1 and 60 days.'])
  expect(wrong({ graceDays: '-3' })).toEqual(['Give whole days.'])
  expect(wrong({ graceDays: '1.5' })).toEqual(['Give whole days.'])
  expect(wrong({ note: ' ' })).toEqual(['Say why, in a sentence.'])
  expect(wrong({ decision: 'forget' })).toEqual(['Say what becomes of the fee.'])
})
