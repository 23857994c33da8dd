import { databaseNow } from '@/db/queries/clock'
import type { Context } from '../context'

type Part = 'up' | 'down'

export interface Health {
  status: Part
  database: Part
  objectStore: Part
  payments: Part
}

const part = (isUp: boolean): Part => (isUp ? 'up' : 'down')

/** Whether what the product needs answers. Mail is left out: letters wait in the outbox while it is down. */
export async function readHealth(ctx: Context): Promise<Health> {
  const [database, objectStore, payments] = await Promise.all([
    databaseNow(ctx.db).then(
      () => true,
      () => false,
    ),
    ctx.storage.isUp(),
    ctx.payments.isUp(),
  ])
  // Without the payment firm proposals still go in: their fee is settled within the grace period.
  return {
    status: part(database && objectStore),
    database: part(database),
    objectStore: part(objectStore),
    payments: part(payments),
  }
}
