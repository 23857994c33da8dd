import { lastCheck, type LogbookCheck } from '@/db/queries/logbookChecks'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { mayReadLogbook } from './policy'

/** What the last check of the chain found; null when it was never checked. */
export async function readLastCheck(ctx: ActingContext): Promise<LogbookCheck | null> {
  authorize(mayReadLogbook(ctx.actor))
  return lastCheck(ctx.db)
}
