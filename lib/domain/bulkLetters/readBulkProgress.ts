import { bulkStates } from '@/db/queries/bulkLetters'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { mayWriteToMany } from './policy'
import type { BulkProgress } from './schema'

/** How far a letter to many has got. */
export async function readBulkProgress(ctx: ActingContext, id: number): Promise<BulkProgress> {
  authorize(mayWriteToMany(ctx.actor))
  const states = await bulkStates(ctx.db, id)
  const of = (...names: string[]) => names.reduce((sum, name) => sum + (states.get(name) ?? 0), 0)
  return {
    total: [...states.values()].reduce((sum, n) => sum + n, 0),
    waiting: of('queued', 'sending'),
    sent: of('sent'),
    refused: of('parked', 'bounced'),
    stopped: of('cancelled'),
  }
}
