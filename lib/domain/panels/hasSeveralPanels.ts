import { panelsOfCall } from '@/db/queries/approvals'
import { findCallBySlug } from '@/db/queries/calls'
import type { Context } from '../context'

/** Whether a call has more panels than one, so that its pages speak of them; false where there is no call. */
export async function hasSeveralPanels(ctx: Pick<Context, 'db'>, callSlug: string): Promise<boolean> {
  const call = await findCallBySlug(ctx.db, callSlug)
  return call !== null && (await panelsOfCall(ctx.db, call.id)).length > 1
}
