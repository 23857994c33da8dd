import { callPanels } from '@/db/queries/callPanels'
import { proposalsByKind, sentSizes } from '@/db/queries/callRules'
import { callCriteria, callKinds, findCallBySlug } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { siteRecordAt } from '@/db/queries/facility'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { mayManageCalls } from './policy'
import { callPhase } from './rules'
import type { Call, CallCriterion, CallKind, CallPanel, CallPhase } from './types'

export interface CallRulesView {
  call: Call
  phase: CallPhase
  utcOffsetHours: number
  /** With proposals of each, begun or sent. */
  kinds: (CallKind & { proposals: number })[]
  panels: CallPanel[]
  criteria: CallCriterion[]
  /** Proposals that have been sent and stand. */
  sent: number
}

/** What a call takes and what it judges by, for the office to change. */
export async function readRules(ctx: Context, slug: string): Promise<CallRulesView> {
  authorize(mayManageCalls(ctx.actor))
  const call = await findCallBySlug(ctx.db, slug)
  if (!call) throw refuse.notFound('call')
  const [now, site, kinds, counts, panels, criteria, sent] = await Promise.all([
    databaseNow(ctx.db),
    siteRecordAt(ctx.db, call.siteId, call.seasonFrom),
    callKinds(ctx.db, call.id),
    proposalsByKind(ctx.db, call.id),
    callPanels(ctx.db, call.id),
    callCriteria(ctx.db, call.id),
    sentSizes(ctx.db, call.id),
  ])
  return {
    call,
    phase: callPhase(call, now),
    utcOffsetHours: site.utcOffsetHours,
    kinds: kinds.map((kind) => ({ ...kind, proposals: counts.get(kind.id) ?? 0 })),
    panels,
    criteria,
    sent: sent.length,
  }
}
