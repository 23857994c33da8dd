import type { DecisionsRow } from '@/db/tables'
import type { Approvable } from './approval'

/** What the rules of approval ask of a stored decision. */
export function approvableOf(row: DecisionsRow): Approvable {
  return {
    version: row.version,
    statement: row.statement,
    changedBy: row.changed_by,
    approvedBy: row.approved_by,
    approvedVersion: row.approved_version,
    isReleased: row.released_at !== null,
  }
}
