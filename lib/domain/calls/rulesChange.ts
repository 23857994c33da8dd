import type { CallsRow } from '@/db/tables'
import type { CallChange } from '@/db/queries/callChanges'
import { refuse } from '@/lib/errors'

/** The rules of a call may be changed until it closes; what has been sent is looked at besides. Changes no column. */
export function rulesChangeOf(row: CallsRow, now: Date): CallChange {
  const isBefore = row.stage === 'planned' || (row.stage === 'published' && now < row.closes_at)
  if (!isBefore) throw refuse.closed('The call has closed: its rules stay as they were.')
  return {}
}
