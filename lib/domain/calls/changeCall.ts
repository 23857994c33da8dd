import { updateCall, lockCall, type CallChange } from '@/db/queries/callChanges'
import { databaseNow } from '@/db/queries/clock'
import type { CallsRow } from '@/db/tables'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { mayManageCalls } from './policy'
import { staleCall } from './staleCall'

interface Logged {
  before?: Record<string, unknown>
  after?: Record<string, unknown>
}

interface Change {
  action: string
  slug: string
  version: number
  /** Pure: the call as it stands and the database's now; throws a refusal or gives what changes. */
  decide: (row: CallsRow, now: Date) => CallChange
  /** What else changes, letters and the like, in the same transaction; what it gives is logged as well. */
  then?: (tx: ActingContext, before: CallsRow, change: CallChange, now: Date) => Promise<Logged | void>
}

/** The one way the office changes a call: lock, decide, guard by version, tell, log. */
export async function changeCall(
  ctx: ActingContext,
  { action, slug, version, decide, then }: Change,
): Promise<void> {
  authorize(mayManageCalls(ctx.actor))
  await inTransaction(ctx, async (tx) => {
    const row = await lockCall(tx.db, slug)
    if (!row) throw refuse.notFound('call')
    if (row.version !== version) throw staleCall(row)
    const now = await databaseNow(tx.db)
    const change = decide(row, now)
    if (!(await updateCall(tx.db, row.id, version, change))) throw staleCall(row)
    const more = (await then?.(tx, row, change, now)) ?? {}
    const before = Object.fromEntries(Object.keys(change).map((key) => [key, row[key as keyof CallsRow]]))
    await writeLogbook(tx, {
      action,
      subject: { kind: 'call', id: row.number },
      actingAs: 'office',
      before: { ...before, ...more.before },
      after: { ...change, ...more.after },
    })
  })
}
