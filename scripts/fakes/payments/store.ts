import { randomBytes } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import type { ApiEvent, Charge, Dispute, PaymentIntent, Refund, StoredSession } from './objects'

export interface RememberedAnswer {
  fingerprint: string
  status: number
  body: string
}

export interface Delivery {
  eventId: string
  attempts: number
  nextAt: number
}

interface State {
  sessions: Record<string, StoredSession>
  intents: Record<string, PaymentIntent>
  charges: Record<string, Charge>
  refunds: Record<string, Refund>
  /** What the next refunds come to. */
  refundsTurn: Refund['status']
  disputes: Record<string, Dispute>
  /** Oldest first. */
  events: ApiEvent[]
  answers: Record<string, RememberedAnswer>
  deliveries: Delivery[]
}

/** All the mock knows, kept in one file; written shortly after each change and when the mock ends. */
export class PaymentStore {
  readonly state: State
  readonly #file: string | null
  #timer: NodeJS.Timeout | undefined

  /** Without a folder everything stays in memory. */
  constructor(folder: string | null) {
    this.#file = folder === null ? null : join(folder, 'payments.json')
    const empty: State = {
      sessions: {},
      intents: {},
      charges: {},
      refunds: {},
      refundsTurn: 'succeeded',
      disputes: {},
      events: [],
      answers: {},
      deliveries: [],
    }
    if (folder !== null) mkdirSync(folder, { recursive: true })
    const stored: Partial<State> =
      this.#file !== null && existsSync(this.#file) ? JSON.parse(readFileSync(this.#file, 'utf8')) : {}
    this.state = { ...empty, ...stored }
  }

  changed(): void {
    if (this.#file === null) return
    this.#timer ??= setTimeout(() => this.flush(), 50)
  }

  flush(): void {
    clearTimeout(this.#timer)
    this.#timer = undefined
    if (this.#file === null) return
    writeFileSync(`${this.#file}.new`, JSON.stringify(this.state), { mode: 0o600 })
    renameSync(`${this.#file}.new`, this.#file)
  }
}

export function newId(prefix: string): string {
  return `${prefix}_${randomBytes(18).toString('base64url').replace(/[-_]/g, 'x')}`
}

export function unixNow(): number {
  return Math.floor(Date.now() / 1000)
}
