import { loggedKinds } from '@/db/queries/logbook'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { mayReadLogbook } from './policy'

/** What the logbook can be narrowed to. */
export async function readLoggedKinds(
  ctx: ActingContext,
): Promise<{ actions: string[]; subjects: string[] }> {
  authorize(mayReadLogbook(ctx.actor))
  return loggedKinds(ctx.db)
}
