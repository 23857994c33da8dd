import { requestsOn, type RequestRow } from '@/db/queries/assessments'
import { findCall } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { grantsOf } from '../actor'
import type { Call } from '../calls/types'
import { barredFrom } from '../conflicts/barredPairs'
import type { ActingContext } from '../context'
import { canSeeRequest } from './policy'

/** Requests an instrument scientist may see: own instruments, closed calls, no interest of one's own. */
export async function visibleRequests(ctx: ActingContext): Promise<{ request: RequestRow; call: Call }[]> {
  const grants = grantsOf(ctx.actor, 'instrument-scientist')
  const ids = grants.flatMap(({ instrumentId }) => instrumentId ?? [])
  const [rows, now] = await Promise.all([
    requestsOn(ctx.db, ids.length < grants.length ? 'all' : ids),
    databaseNow(ctx.db),
  ])
  const calls = new Map<number, { call: Call; barred: ReadonlySet<number> }>()
  for (const callId of new Set(rows.map((row) => row.callId))) {
    const call = await findCall(ctx.db, callId)
    if (call) calls.set(callId, { call, barred: await barredFrom(ctx.db, ctx.actor.personId, callId) })
  }
  return rows.flatMap((request) => {
    const entry = calls.get(request.callId)
    if (!entry) return []
    const { call, barred } = entry
    const decision = canSeeRequest(ctx.actor, {
      instrumentId: request.instrumentId,
      proposalState: request.proposalState,
      call,
      isBarred: barred.has(request.proposalId),
      now,
    })
    return decision.allowed ? [{ request, call }] : []
  })
}
