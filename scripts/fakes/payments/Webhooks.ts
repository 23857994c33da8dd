import { randomInt } from 'node:crypto'
import { signatureHeader } from './signature'
import { unixNow, type Delivery, type PaymentStore } from './store'
import type { ApiEvent } from './objects'

export interface WebhookTarget {
  url: string
  secret: string
}

export interface SendOptions {
  /** Seconds added to the signature's time: positive is the future, negative the past. */
  shift?: number
  secret?: string
}

const waits = [1, 2, 5, 10, 30, 60]

/** Delivers each event until the receiver answers 2xx, with growing pauses; survives a restart of the mock. */
export class Webhooks {
  readonly #store: PaymentStore
  readonly #target: WebhookTarget
  readonly #active = new Map<string, Promise<void>>()
  readonly #timer: NodeJS.Timeout
  #on = true

  constructor(store: PaymentStore, target: WebhookTarget) {
    this.#store = store
    this.#target = target
    this.#timer = setInterval(() => void this.#deliverDue(), 250)
    this.#timer.unref()
  }

  get isOn(): boolean {
    return this.#on
  }

  /** Off: events are made and listed, but none is sent until it is on again. */
  switchTo(on: boolean): void {
    this.#on = on
  }

  close(): void {
    clearInterval(this.#timer)
  }

  enqueue(event: ApiEvent): void {
    this.#store.state.deliveries.push({ eventId: event.id, attempts: 0, nextAt: 0 })
    this.#store.changed()
  }

  /** Sends what is due now; resolves when those attempts are over. */
  async deliverNow(): Promise<void> {
    await this.#deliverDue()
  }

  /**
   * Sends everything that waits, also while switched off: in another order, each several times, or dated ahead. What
   * is acknowledged waits no longer. Tells the status of each sending.
   */
  async flush(order: 'reversed' | 'shuffled' | null, copies: number, shift: number): Promise<number[]> {
    const { state } = this.#store
    const waiting = state.deliveries.flatMap((delivery) =>
      Array.from({ length: copies }, () => ({ delivery, lot: randomInt(2 ** 32) })),
    )
    if (order === 'reversed') waiting.reverse()
    if (order === 'shuffled') waiting.sort((a, b) => a.lot - b.lot)
    const statuses: number[] = []
    for (const { delivery } of waiting) {
      const event = state.events.find(({ id }) => id === delivery.eventId)
      const status = event ? await this.send(event, { shift }) : 0
      statuses.push(status)
      if (status >= 200 && status < 300)
        state.deliveries = state.deliveries.filter((each) => each !== delivery)
    }
    this.#store.changed()
    return statuses
  }

  /** One POST of one event; the status received, or 0 when nobody answered. */
  async send(
    event: ApiEvent,
    { shift = 0, secret = this.#target.secret }: SendOptions = {},
  ): Promise<number> {
    const payload = JSON.stringify(event, null, 2)
    try {
      const response = await fetch(this.#target.url, {
        method: 'POST',
        headers: {
          'content-type': 'application/json; charset=utf-8',
          'user-agent': 'payment-mock/1.0',
          'stripe-signature': signatureHeader(payload, secret, unixNow() + shift),
        },
        body: payload,
        redirect: 'manual',
        signal: AbortSignal.timeout(10_000),
      })
      await response.arrayBuffer()
      return response.status
    } catch {
      return 0
    }
  }

  async #deliverDue(): Promise<void> {
    if (!this.#on) return
    const due = this.#store.state.deliveries.filter(({ nextAt }) => nextAt <= Date.now())
    for (const delivery of due) {
      if (this.#active.has(delivery.eventId)) continue
      const attempt = this.#deliver(delivery).finally(() => this.#active.delete(delivery.eventId))
      this.#active.set(delivery.eventId, attempt)
    }
    await Promise.all(due.map(({ eventId }) => this.#active.get(eventId)))
  }

  async #deliver(delivery: Delivery): Promise<void> {
    const { state } = this.#store
    const event = state.events.find(({ id }) => id === delivery.eventId)
    const status = event ? await this.send(event) : 200
    delivery.attempts += 1
    if (status >= 200 && status < 300) {
      if (event) event.pending_webhooks = 0
      state.deliveries = state.deliveries.filter((each) => each !== delivery)
    } else {
      const wait = waits[Math.min(delivery.attempts, waits.length) - 1] ?? 60
      delivery.nextAt = Date.now() + wait * 1000
      console.log(`webhook ${event?.type} answered ${status || 'nothing'}; next try in ${wait} s`)
    }
    this.#store.changed()
  }
}
