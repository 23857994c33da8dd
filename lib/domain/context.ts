import type { Database } from '@/db/client'
import type { ObjectStore } from '@/lib/services/storage/ObjectStore'
import type { Payments } from '@/lib/services/payments/Payments'
import type { Actor } from './actor'

/** Source of random bytes; tests give a seeded one. */
export interface RandomSource {
  bytes(length: number): Uint8Array
}

/** Everything a verb may reach. The deadline is never judged by the application's clock: see db/queries/clock. */
export interface Context {
  readonly actor: Actor | null
  readonly db: Database
  readonly random: RandomSource
  readonly storage: ObjectStore
  readonly payments: Payments
  readonly request: {
    readonly id: string
    readonly address: string
    readonly userAgent: string
    /** Where the product is reached, for links in letters and return addresses. */
    readonly origin: string
  }
}

/** A context whose actor is known. */
export interface ActingContext extends Context {
  readonly actor: Actor
}
