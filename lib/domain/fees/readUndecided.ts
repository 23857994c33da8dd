import { undecidedDisputes, type UndecidedDispute } from '@/db/queries/disputes'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { mayHandleFees } from './policy'

/** Lost disputes that wait for the office, of all calls. */
export async function readUndecided(ctx: ActingContext): Promise<UndecidedDispute[]> {
  authorize(mayHandleFees(ctx.actor))
  return undecidedDisputes(ctx.db)
}
