import { seatsHeld, type LedPanel } from '@/db/queries/panel'
import type { ActingContext } from '../context'
import { canLeadPanel } from './policy'

/** The panels of a call that a person leads, in the order they were made. */
export async function ledPanels(ctx: ActingContext, callId: number): Promise<LedPanel[]> {
  const seats = await seatsHeld(ctx.db, callId, ctx.actor.personId)
  return seats.filter((seat) => canLeadPanel(ctx.actor, { ...seat, callId }).allowed)
}
