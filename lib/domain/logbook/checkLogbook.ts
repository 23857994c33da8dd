import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { checkChain, type ChainReport } from './checkChain'
import { mayReadLogbook } from './policy'

/** Checks the whole chain now, for the office. */
export async function checkLogbook(ctx: ActingContext): Promise<ChainReport> {
  authorize(mayReadLogbook(ctx.actor))
  return checkChain(ctx.db, ctx.actor.personId)
}
