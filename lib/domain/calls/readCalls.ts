import { listCalls } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import type { Context } from '../context'
import { mayReadCall } from './policy'
import { callPhase } from './rules'
import type { Call, CallPhase } from './types'

/** The calls this reader may see, the newest first, each with its phase. */
export async function readCalls(ctx: Context): Promise<{ call: Call; phase: CallPhase }[]> {
  const [now, calls] = await Promise.all([databaseNow(ctx.db), listCalls(ctx.db)])
  return calls
    .filter((call) => mayReadCall(ctx.actor, call).allowed)
    .map((call) => ({ call, phase: callPhase(call, now) }))
}
