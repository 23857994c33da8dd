import { callKinds, listCalls } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { deadlineOf, takesProposals } from '../calls/rules'
import type { Call, CallKind } from '../calls/types'
import type { Context } from '../context'

export interface OpenKind {
  call: Call
  kind: CallKind
  deadline: Date
}

/** What can be begun now: the kinds of every open call, by the database's clock. */
export async function readOpenKinds(ctx: Context): Promise<OpenKind[]> {
  const [now, calls] = await Promise.all([databaseNow(ctx.db), listCalls(ctx.db)])
  const open = calls.filter((call) => call.stage === 'published' && now >= call.opensAt)
  const kinds = await Promise.all(
    open.map(async (call) =>
      (await callKinds(ctx.db, call.id)).map((kind) => ({
        call,
        kind,
        deadline: deadlineOf(call, kind, { closesAt: null }),
      })),
    ),
  )
  return kinds.flat().filter(({ call, deadline }) => takesProposals(call, deadline, now))
}
