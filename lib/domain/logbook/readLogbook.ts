import { listLogbook } from '@/db/queries/logbook'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { mayReadLogbook } from './policy'
import { askedOfLogbook } from './rules'
import type { LogbookFilterInput, LogbookReply } from './schema'

const page = 500

/** A page of the logbook, the newest first. */
export async function readLogbook(
  ctx: ActingContext,
  beforeId: number | null,
  filter: LogbookFilterInput = {},
): Promise<LogbookReply> {
  authorize(mayReadLogbook(ctx.actor))
  const lines = await listLogbook(ctx.db, page + 1, beforeId, askedOfLogbook(filter))
  return {
    hasMore: lines.length > page,
    rows: lines.slice(0, page).map((line) => ({
      id: line.id,
      at: line.at.toISOString(),
      person: line.person,
      actingAs: line.acting_as,
      action: line.action,
      subject: `${line.subject_kind} ${line.subject_id}`,
      before: line.before_value ?? '',
      after: line.after_value ?? '',
      address: line.address,
    })),
  }
}
