import { callCriteria, callKinds, findCallBySlug, listCalls } from '@/db/queries/calls'
import { correctionsOf } from '@/db/queries/corrections'
import { databaseNow } from '@/db/queries/clock'
import { ratesOfCall } from '@/db/queries/feeRates'
import { modeRecordsOnOffer, siteRecordAt } from '@/db/queries/facility'
import { offerOfCall, type TelescopeOffer } from '@/db/queries/nights'
import { refuse } from '@/lib/errors'
import { authorize } from '@/lib/auth/authorize'
import type { Context } from '../context'
import type { ModeRecord, SiteRecord } from '../facility/types'
import { mayReadCall } from './policy'
import { callPhase } from './rules'
import type { Call, CallCriterion, CallKind, CallPhase, Correction, FeeRate } from './types'

export interface CallView {
  call: Call
  phase: CallPhase
  now: Date
  site: SiteRecord
  kinds: CallKind[]
  criteria: CallCriterion[]
  /** What a kind costs by where it is led from; none where it costs everyone the same. */
  rates: FeeRate[]
  modes: ModeRecord[]
  offer: TelescopeOffer[]
  corrections: Correction[]
}

async function viewOf(ctx: Context, call: Call): Promise<CallView> {
  const [now, site, kinds, criteria, rates, modes, offer, corrections] = await Promise.all([
    databaseNow(ctx.db),
    siteRecordAt(ctx.db, call.siteId, call.seasonFrom),
    callKinds(ctx.db, call.id),
    callCriteria(ctx.db, call.id),
    ratesOfCall(ctx.db, call.id),
    modeRecordsOnOffer(ctx.db, call.id, call.seasonFrom),
    offerOfCall(ctx.db, call.id),
    correctionsOf(ctx.db, call.id),
  ])
  return { call, phase: callPhase(call, now), now, site, kinds, criteria, rates, modes, offer, corrections }
}

/** A call as everyone may read it; one still being planned is the office's alone. */
export async function readCall(ctx: Context, slug: string): Promise<CallView> {
  const call = await findCallBySlug(ctx.db, slug)
  if (!call) throw refuse.notFound('call')
  authorize(mayReadCall(ctx.actor, call))
  return viewOf(ctx, call)
}

/** The call the landing speaks of: the open one that closes first, else the newest published; null when there is none. */
export async function readCurrentCall(ctx: Context): Promise<CallView | null> {
  const [now, calls] = await Promise.all([databaseNow(ctx.db), listCalls(ctx.db)])
  const shown = calls.filter((call) => call.stage !== 'planned')
  const open = shown
    .filter((call) => callPhase(call, now) === 'open')
    .sort((a, b) => a.closesAt.getTime() - b.closesAt.getTime())
  const call = open[0] ?? shown[0]
  return call ? viewOf(ctx, call) : null
}
