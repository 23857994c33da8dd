import { findCallBySlug } from '@/db/queries/calls'
import type { ActingContext } from '../context'
import { ledPanels } from './ledPanels'

/** What a leader of several panels of a call chooses from; empty to whoever leads none, and where there is no call. */
export async function readLedPanels(
  ctx: ActingContext,
  callSlug: string,
): Promise<{ id: number; name: string }[]> {
  const call = await findCallBySlug(ctx.db, callSlug)
  if (!call) return []
  return (await ledPanels(ctx, call.id)).map(({ id, name }) => ({ id, name }))
}
