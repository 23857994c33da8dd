import { findCallBySlug } from '@/db/queries/calls'
import { correctionsOf } from '@/db/queries/corrections'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { mayReadCall } from './policy'
import type { Correction } from './types'

/** The corrections of a call, the newest first, for whoever may read it. */
export async function readCorrections(ctx: Context, slug: string): Promise<Correction[]> {
  const call = await findCallBySlug(ctx.db, slug)
  if (!call) throw refuse.notFound('call')
  authorize(mayReadCall(ctx.actor, call))
  return correctionsOf(ctx.db, call.id)
}
