import type { Paper } from '../proposals/writingTypes'

/** A paper of a sent proposal, opened by the office for one replacement. */
export interface PaperRepair {
  id: number
  kind: Paper['kind']
  /** What is wrong with the file that was sent. */
  reason: string
  openedAt: Date
  openedBy: string
  openUntil: Date
  takenBackAt: Date | null
  /** The version the replacement became; null while unused. */
  versionNumber: number | null
}
