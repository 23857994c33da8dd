import { randomBytes, randomUUID } from 'node:crypto'
import type { Database } from '@/db/client'
import type { Actor } from '@/lib/domain/actor'
import type { Context } from '@/lib/domain/context'
import { fakePayments } from './fakePayments'
import { memoryStore } from './memoryStore'

/** A context to call verbs in: memory for objects, a payment firm in memory, real randomness. */
export function testContext<A extends Actor | null>(
  db: Database,
  actor: A,
  over: Partial<Omit<Context, 'actor' | 'db'>> = {},
): Context & { readonly actor: A } {
  return {
    actor,
    db,
    random: { bytes: (length) => randomBytes(length) },
    storage: memoryStore(),
    payments: fakePayments(),
    request: { id: randomUUID(), address: '127.0.0.1', userAgent: 'vitest', origin: 'http://127.0.0.1:3000' },
    ...over,
  }
}
