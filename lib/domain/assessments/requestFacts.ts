import { findRequest, type RequestRow } from '@/db/queries/assessments'
import { findCall } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { refuse } from '@/lib/errors'
import type { Call } from '../calls/types'
import { barredFrom } from '../conflicts/barredPairs'
import type { ActingContext } from '../context'
import type { RequestFacts } from './policy'

export interface FullRequestFacts extends RequestFacts {
  request: RequestRow
  call: Call
}

/** Everything a policy asks about a request. With `lock`, it stays as it is until the transaction ends. */
export async function requestFacts(
  ctx: ActingContext,
  requestId: number,
  lock: boolean,
): Promise<FullRequestFacts> {
  const request = await findRequest(ctx.db, requestId, lock)
  const call = request ? await findCall(ctx.db, request.callId) : null
  if (!request || !call) throw refuse.notFound('request')
  const [barred, now] = await Promise.all([
    barredFrom(ctx.db, ctx.actor.personId, call.id),
    databaseNow(ctx.db),
  ])
  return {
    request,
    call,
    instrumentId: request.instrumentId,
    proposalState: request.proposalState,
    isBarred: barred.has(request.proposalId),
    now,
  }
}
