import 'server-only'
import { randomBytes } from 'node:crypto'
import type { Actor } from '@/lib/domain/actor'
import type { Context } from '@/lib/domain/context'
import { services } from '@/lib/services/services'

/** The context of a request: real services, real randomness. */
export function contextFor<A extends Actor | null>(
  actor: A,
  request: Context['request'],
): Context & { readonly actor: A } {
  const { db, storage, payments } = services()
  return { actor, db, storage, payments, random: { bytes: (length) => randomBytes(length) }, request }
}
