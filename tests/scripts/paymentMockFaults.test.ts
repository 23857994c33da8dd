import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { startPaymentMockRig, type PaymentMockRig } from './paymentMockRig'

let rig: PaymentMockRig

beforeEach(async () => {
  rig = await startPaymentMockRig()
})
afterEach(() => rig.close())

async function sessionCount(): Promise<number> {
  return (await rig.stripe.checkout.sessions.list({ limit: 100 })).data.length
}

// Seen to fail with answers kept by key alone, without a fingerprint of the parameters.
describe('idempotency', () => {
  it('answers the same session for the same key', async () => {
    const first = await rig.createSession('fee-17')
    const second = await rig.createSession('fee-17')
    expect(second.id).toBe(first.id)
    expect(await sessionCount()).toBe(1)
  })

  it('refuses the same key with other parameters', async () => {
    await rig.createSession('fee-17')
    await expect(rig.createSession('fee-17', 15_000)).rejects.toMatchObject({
      type: 'StripeIdempotencyError',
    })
  })

  it('replays a failure of the service too', async () => {
    await rig.control('/mock/faults', { next: '500' })
    await expect(rig.createSession('fee-17')).rejects.toMatchObject({ statusCode: 500 })
    await expect(rig.createSession('fee-17')).rejects.toMatchObject({ statusCode: 500 })
    expect(await sessionCount()).toBe(0)
  })

  it('finds the work done when only its answer was lost', async () => {
    // Twice, as the SDK itself tries again once after a cut line.
    await rig.control('/mock/faults', { next: 'lost-answer', times: 2 })
    await expect(rig.createSession('fee-17')).rejects.toMatchObject({ type: 'StripeConnectionError' })
    await rig.createSession('fee-17')
    expect(await sessionCount()).toBe(1)
  })
})

describe('faults of the API', () => {
  it.each([
    ['429', 1, 'StripeRateLimitError'],
    ['reset', 2, 'StripeConnectionError'],
    ['timeout', 1, 'StripeConnectionError'],
  ])('shows %s, then works again', async (next, times, type) => {
    await rig.control('/mock/faults', { next, times, seconds: 4 })
    await expect(rig.createSession()).rejects.toMatchObject({ type })
    expect((await rig.createSession()).status).toBe('open')
  })

  it("refuses bad parameters in the service's own words", async () => {
    await expect(rig.createSession(undefined, 0)).rejects.toMatchObject({ code: 'amount_too_small' })
    await expect(rig.stripe.checkout.sessions.retrieve('cs_test_none')).rejects.toMatchObject({
      code: 'resource_missing',
      statusCode: 404,
    })
  })
})

describe('webhooks', () => {
  it('repeats until the receiver acknowledges', async () => {
    const session = await rig.createSession()
    rig.receiver.status = 500
    await rig.press(session.id, 'pays')
    expect(rig.receiver.accepted).toHaveLength(0)
    rig.receiver.status = 200
    await expect.poll(() => rig.receiver.types(), { timeout: 5000 }).toContain('checkout.session.completed')
  })

  it('stays silent while switched off, and lists the events all the same', async () => {
    await rig.control('/mock/webhook-off')
    const session = await rig.createSession()
    await rig.press(session.id, 'pays')
    expect(rig.receiver.accepted).toHaveLength(0)
    const listed = await rig.stripe.events.list({ types: ['checkout.session.completed'] })
    expect(listed.data.map((event) => event.type)).toEqual(['checkout.session.completed'])
    await rig.control('/mock/webhook-on')
    expect(rig.receiver.types()).toContain('checkout.session.completed')
  })

  it('resends one event many times, dated ahead or signed with another secret when asked', async () => {
    const session = await rig.createSession()
    await rig.press(session.id, 'pays')
    const [event] = (await rig.stripe.events.list({ type: 'checkout.session.completed' })).data
    const path = `/mock/events/${event?.id}/resend`
    const before = rig.receiver.accepted.length
    expect(await (await rig.control(path, { count: 3 })).json()).toEqual({ statuses: [200, 200, 200] })
    expect(rig.receiver.accepted.length - before).toBe(3)
    expect(await (await rig.control(path, { secret: 'whsec_other' })).json()).toEqual({ statuses: [400] })
    expect(await (await rig.control(path, { future: -400 })).json()).toEqual({ statuses: [400] })
  })
})

describe('refunds', () => {
  it('refunds in part and in whole, never more than was paid', async () => {
    const session = await rig.createSession()
    await rig.press(session.id, 'pays')
    const { payment_intent: intent } = await rig.stripe.checkout.sessions.retrieve(session.id)
    const payment_intent = String(intent)
    const part = await rig.stripe.refunds.create({ payment_intent, amount: 5000 })
    expect(part).toMatchObject({ status: 'succeeded', amount: 5000, payment_intent })
    await expect(rig.stripe.refunds.create({ payment_intent, amount: 8000 })).rejects.toThrow('greater than')
    expect((await rig.stripe.refunds.create({ payment_intent })).amount).toBe(7000)
    await expect(rig.stripe.refunds.create({ payment_intent })).rejects.toMatchObject({
      code: 'charge_already_refunded',
    })
    const paid = await rig.stripe.paymentIntents.retrieve(payment_intent, { expand: ['latest_charge'] })
    expect(paid.latest_charge).toMatchObject({ refunded: true, amount_refunded: 12_000 })
  })
})
