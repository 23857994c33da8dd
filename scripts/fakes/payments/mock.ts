import type { Server } from 'node:http'
import { setTimeout as sleep } from 'node:timers/promises'
import Stripe from 'stripe'
import { json, listenOnLoopback, redirect, type FakeRequest, type FakeResponse } from '../web/httpServer'
import { fontFile, fontPath } from '../web/page'
import { callApi, type Api } from './api'
import { afterwards } from './afterwards'
import { ApiError } from './ApiError'
import { attempt, outcomes } from './attempts'
import { findSession } from './checkout'
import { controlMock } from './controls'
import { Faults } from './Faults'
import { homePage } from './homePage'
import { Idempotency } from './idempotency'
import type { ApiEvent } from './objects'
import { payPage, successUrl } from './payPage'
import { newId, PaymentStore, unixNow } from './store'
import { Webhooks, type WebhookTarget } from './Webhooks'

export interface PaymentMockPlan {
  /** Where state is kept; null keeps it in memory. */
  folder: string | null
  port: number
  webhook: WebhookTarget
}

/** The payment service of demo and tests: the API that the real SDK calls, a page to pay on, signed webhooks. */
export class PaymentMock {
  readonly #store: PaymentStore
  readonly #webhooks: Webhooks
  readonly #faults = new Faults()
  readonly #idempotency: Idempotency
  readonly #api: Api
  readonly #sweep: NodeJS.Timeout
  #server: Server | undefined

  private constructor({ folder, port, webhook }: PaymentMockPlan) {
    this.#store = new PaymentStore(folder)
    this.#webhooks = new Webhooks(this.#store, webhook)
    this.#idempotency = new Idempotency(this.#store)
    this.#api = {
      store: this.#store,
      pageBase: `http://127.0.0.1:${port}`,
      announce: (happenings, key) =>
        happenings.forEach(({ type, object }) => this.#record(type, object, key)),
    }
    this.#sweep = setInterval(() => this.#expireOverdue(), 1000)
    this.#sweep.unref()
  }

  static async start(plan: PaymentMockPlan): Promise<PaymentMock> {
    const mock = new PaymentMock(plan)
    mock.#server = await listenOnLoopback(plan.port, (request) => mock.#answer(request))
    return mock
  }

  async close(): Promise<void> {
    clearInterval(this.#sweep)
    this.#webhooks.close()
    this.#store.flush()
    const server = this.#server
    server?.closeAllConnections()
    await new Promise((resolve) => (server ? server.close(resolve) : resolve(undefined)))
  }

  async #answer(request: FakeRequest): Promise<FakeResponse> {
    try {
      if (request.path.startsWith('/v1/')) return await this.#callApi(request)
      if (request.path.startsWith('/pay/')) return await this.#pay(request)
      if (request.path.startsWith('/mock/')) {
        return await controlMock(request, this.#api, this.#webhooks, this.#faults)
      }
      if (request.path === '/') return homePage(this.#store)
      if (request.path.startsWith('/after/') && request.method === 'POST') return this.#after(request)
      if (request.path === fontPath) return fontFile()
      return json(404, { error: 'There is nothing here.' })
    } catch (error) {
      if (error instanceof ApiError) return json(error.status, error.body())
      throw error
    }
  }

  async #callApi(request: FakeRequest): Promise<FakeResponse> {
    const requestId = newId('req')
    const response = await this.#faults.around(`${request.method} ${request.path}`, (instead) =>
      this.#idempotency.once(request, async () => instead ?? callApi(this.#api, request)),
    )
    return { ...response, headers: { ...response.headers, 'request-id': requestId } }
  }

  async #pay(request: FakeRequest): Promise<FakeResponse> {
    const stored = findSession(this.#store, request.path.slice('/pay/'.length))
    const wish = new URLSearchParams(request.body).get('outcome')
    if (request.method !== 'POST' || stored.session.status !== 'open') return payPage(stored, null, false)
    if (wish === 'run-out') {
      stored.session.expires_at = unixNow()
      this.#expireOverdue()
      return payPage(stored, null, false)
    }
    if (wish === 'leave') return redirect(stored.session.cancel_url ?? successUrl(stored.session))
    const outcome = outcomes.find((known) => known === wish)
    if (!outcome) return payPage(stored, 'Choose one of the answers.', false)
    this.#api.announce(attempt(this.#store, stored, outcome), null)
    // The receiver gets a moment to hear of it before the person returns; it is not waited for longer.
    await Promise.race([this.#webhooks.deliverNow(), sleep(5000, undefined, { ref: false })])
    if (stored.session.status !== 'open') return redirect(successUrl(stored.session))
    const intent = stored.intentId === null ? undefined : this.#store.state.intents[stored.intentId]
    return payPage(stored, intent?.last_payment_error?.message ?? null, outcome === 'authentication')
  }

  /** A button of the list of payments: what the card holder's bank or the firm's own people do. */
  #after(request: FakeRequest): FakeResponse {
    const deed = new URLSearchParams(request.body).get('deed') ?? ''
    afterwards(this.#api, request.path.slice('/after/'.length), deed)
    return redirect('/')
  }

  #record(type: string, object: ApiEvent['data']['object'], idempotencyKey: string | null): void {
    const event: ApiEvent = {
      id: newId('evt'),
      object: 'event',
      api_version: Stripe.API_VERSION,
      created: unixNow(),
      data: { object: structuredClone(object) },
      livemode: false,
      pending_webhooks: 1,
      request: { id: newId('req'), idempotency_key: idempotencyKey },
      type,
    }
    this.#store.state.events.push(event)
    this.#webhooks.enqueue(event)
  }

  #expireOverdue(): void {
    for (const { session } of Object.values(this.#store.state.sessions)) {
      if (session.status !== 'open' || session.expires_at > unixNow()) continue
      Object.assign(session, { status: 'expired', url: null })
      this.#api.announce([{ type: 'checkout.session.expired', object: session }], null)
    }
  }
}
