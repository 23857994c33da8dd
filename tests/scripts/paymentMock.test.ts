import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import Stripe from 'stripe'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { startPaymentMockRig, type PaymentMockRig } from './paymentMockRig'

let rig: PaymentMockRig

beforeEach(async () => {
  rig = await startPaymentMockRig()
})
afterEach(() => rig.close())

// Seen to fail with the signature made over the payload alone, and with the session left open after paying.
describe('paying on the hosted page', () => {
  it('creates an open session with a page that shows what is paid', async () => {
    const session = await rig.createSession()
    expect(session).toMatchObject({
      object: 'checkout.session',
      status: 'open',
      payment_status: 'unpaid',
      payment_intent: null,
      amount_total: 12_000,
      currency: 'eur',
      metadata: { proposal: '17' },
    })
    const page = await (await fetch(session.url ?? '')).text()
    expect(page).toContain('Test payments, no money moves')
    expect(page).toContain('EUR 120.00')
    expect(page).toContain('Fee of proposal 4F7-K2M')
  })

  it('pays, sends a signed webhook the SDK accepts, and returns the person with the session id', async () => {
    const session = await rig.createSession()
    const response = await rig.press(session.id, 'pays')
    expect(response.status).toBe(303)
    expect(response.headers.get('location')).toBe(`http://127.0.0.1:3000/back?session=${session.id}`)
    expect(rig.receiver.refused).toBe(0)
    expect(rig.receiver.types().sort()).toEqual([
      'charge.succeeded',
      'checkout.session.completed',
      'payment_intent.created',
      'payment_intent.succeeded',
    ])
    expect(rig.receiver.accepted.every((event) => event.api_version === Stripe.API_VERSION)).toBe(true)
    const paid = await rig.stripe.checkout.sessions.retrieve(session.id, {
      expand: ['payment_intent.latest_charge', 'line_items'],
    })
    expect(paid).toMatchObject({
      status: 'complete',
      payment_status: 'paid',
      url: null,
      payment_intent: { status: 'succeeded', amount_received: 12_000, latest_charge: { paid: true } },
      line_items: { data: [{ amount_total: 12_000 }] },
    })
  })

  it.each([
    ['declined', 'Your card was declined.', 'generic_decline'],
    ['insufficient-funds', 'Your card has insufficient funds.', 'insufficient_funds'],
  ])('stays on the page when the card is %s', async (outcome, sentence, declineCode) => {
    const session = await rig.createSession()
    const response = await rig.press(session.id, outcome)
    expect(response.status).toBe(200)
    expect(await response.text()).toContain(sentence)
    const failure = rig.receiver.accepted.find((event) => event.type === 'payment_intent.payment_failed')
    expect(failure?.data.object).toMatchObject({
      status: 'requires_payment_method',
      last_payment_error: { code: 'card_declined', decline_code: declineCode },
      metadata: { proposal: '17' },
    })
    expect((await rig.stripe.checkout.sessions.retrieve(session.id)).status).toBe('open')
    expect((await rig.press(session.id, 'pays')).status).toBe(303)
  })

  it('asks the bank first, and pays or fails by its answer', async () => {
    const session = await rig.createSession()
    expect(await (await rig.press(session.id, 'authentication')).text()).toContain('The bank asks')
    expect(await (await rig.press(session.id, 'refuse')).text()).toContain('unable to authenticate')
    await rig.press(session.id, 'authentication')
    expect((await rig.press(session.id, 'approve')).status).toBe(303)
  })

  it('lets the person leave without paying', async () => {
    const session = await rig.createSession()
    const response = await rig.press(session.id, 'leave')
    expect(response.headers.get('location')).toBe('http://127.0.0.1:3000/left')
    expect((await rig.stripe.checkout.sessions.retrieve(session.id)).status).toBe('open')
  })

  it('charges once when the page is sent twice', async () => {
    const session = await rig.createSession()
    await Promise.all([rig.press(session.id, 'pays'), rig.press(session.id, 'pays')])
    const charges = rig.receiver.types().filter((type) => type === 'charge.succeeded')
    expect(charges).toHaveLength(1)
  })

  it('closes the page of an expired session and tells the application', async () => {
    const session = await rig.createSession()
    expect((await rig.stripe.checkout.sessions.expire(session.id)).status).toBe('expired')
    expect((await rig.press(session.id, 'pays')).status).toBe(410)
    await expect.poll(() => rig.receiver.types(), { timeout: 3000 }).toEqual(['checkout.session.expired'])
    await expect(rig.stripe.checkout.sessions.expire(session.id)).rejects.toThrow('can be expired')
  })

  it('keeps its state over a restart', async () => {
    const folder = mkdtempSync(join(tmpdir(), 'payment-mock-'))
    const first = await startPaymentMockRig(folder)
    const session = await first.createSession()
    await first.press(session.id, 'pays')
    await first.close()
    const second = await startPaymentMockRig(folder)
    const kept = await second.stripe.checkout.sessions.retrieve(session.id)
    await second.close()
    rmSync(folder, { recursive: true })
    expect(kept.payment_status).toBe('paid')
  })
})
