import { findCallBySlug } from '@/db/queries/calls'
import { modesForOffer, type OfferedMode } from '@/db/queries/offers'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { mayManageCalls } from './policy'

/** Every mode a call may offer, with what it offers now. */
export async function readOffer(ctx: Context, slug: string): Promise<OfferedMode[]> {
  authorize(mayManageCalls(ctx.actor))
  const call = await findCallBySlug(ctx.db, slug)
  if (!call) throw refuse.notFound('call')
  return modesForOffer(ctx.db, call)
}
