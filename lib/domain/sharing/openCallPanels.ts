import { panelsOfCall } from '@/db/queries/approvals'
import { findCall, findCallBySlug } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { lockCall } from '@/db/queries/decisions'
import { lockPanelsOf } from '@/db/queries/shareRules'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { callPhase } from '../calls/rules'
import type { Call, CallPhase } from '../calls/types'
import { barredFrom } from '../conflicts/barredPairs'
import type { ActingContext } from '../context'
import { ledPanels } from '../panels/ledPanels'
import { maySeeSharing } from './policy'

/** All panels of a call, as someone who leads one of them or the office meets them. */
export interface CallPanels {
  call: Call
  phase: CallPhase
  panels: { id: number; name: string }[]
  /** Keys of the panels the person leads. */
  led: number[]
  /** Proposals the person has an interest in: never shown to them. */
  hidden: ReadonlySet<number>
}

/** Opens a call's panels for reading, or, by its key, for writing: locked with all its panels. */
export async function openCallPanels(
  ctx: ActingContext,
  key: { slug: string } | { callId: number },
): Promise<CallPanels> {
  if ('callId' in key) {
    await lockPanelsOf(ctx.db, key.callId)
    await lockCall(ctx.db, key.callId)
  }
  const call = 'slug' in key ? await findCallBySlug(ctx.db, key.slug) : await findCall(ctx.db, key.callId)
  if (!call) throw refuse.notFound('panel')
  const led = (await ledPanels(ctx, call.id)).map(({ id }) => id)
  authorize(maySeeSharing(ctx.actor, led.length > 0))
  const [panels, hidden, now] = await Promise.all([
    panelsOfCall(ctx.db, call.id),
    barredFrom(ctx.db, ctx.actor.personId, call.id),
    databaseNow(ctx.db),
  ])
  return { call, phase: callPhase(call, now), panels, led, hidden }
}
