import type { ActionResult } from '@/lib/actions/result'
import type { SaveReviewTextInput, SaveScoreInput } from '@/lib/domain/reviews/schema'
import type { SheetCriterion, SheetText } from '@/lib/domain/reviews/types'

/** The server actions of a score sheet. */
export interface SheetActions {
  saveScore: (input: SaveScoreInput) => Promise<ActionResult<{ halfPoints: number | null }>>
  saveText: (input: SaveReviewTextInput) => Promise<ActionResult<{ version: number }>>
  finish: (input: { assignmentId: number; version: number }) => Promise<ActionResult<{ version: number }>>
  reopen: (input: { assignmentId: number; version: number }) => Promise<ActionResult<{ version: number }>>
}

export interface SheetProps {
  assignmentId: number
  version: number
  isFinished: boolean
  criteria: readonly SheetCriterion[]
  texts: readonly SheetText[]
  savedAtMs: number | null
  /** Why the sheet cannot be written on; null when it can. */
  shut: string | null
  mayReopen: boolean
  nextHref: string | null
  actions: SheetActions
}
