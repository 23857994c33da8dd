export interface Approvable {
  version: number
  statement: string
  /** Who changed it last, and who approved which version of it. */
  changedBy: number | null
  approvedBy: number | null
  approvedVersion: number | null
  isReleased: boolean
}

/** A second person has approved it exactly as it stands: every change to words or hours asks for the approval again. */
export function isApproved(decision: Approvable): boolean {
  return (
    decision.approvedBy !== null &&
    decision.approvedBy !== decision.changedBy &&
    // Making it known raises the version once more.
    decision.approvedVersion === decision.version - (decision.isReleased ? 1 : 0)
  )
}

/** `waits` for a second person, `changed` since one approved it, or approved. */
export function approvalState(decision: Approvable): 'waits' | 'changed' | 'approved' {
  if (isApproved(decision)) return 'approved'
  return decision.approvedBy === null ? 'waits' : 'changed'
}

/** Why this person may not stand behind a decision; null when they may, once they have opened it. */
export function whyNotApproved(decision: Approvable, personId: number): string | null {
  if (decision.isReleased) return 'This decision has been made known; it stands.'
  if (decision.statement.trim() === '') return 'It is not prepared yet: it needs a statement.'
  if (decision.changedBy === personId)
    return 'You prepared this decision, or changed it last. Someone else approves it.'
  return isApproved(decision) ? 'It is approved already.' : null
}
