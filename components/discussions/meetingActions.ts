import type { FormAction } from '@/components/forms/actionFormTypes'
import type { ActionResult } from '@/lib/actions/result'

export type PresenceAction = (input: {
  panelId: number
  personId: number
  isPresent: boolean
}) => Promise<ActionResult<void>>

export type DiscussAction = (input: {
  panelId: number
  proposalId: number | null
}) => Promise<ActionResult<void>>

export type LeaveTableAction = FormAction<
  { panelId: number; proposalId: number; kind: string; reason: string },
  { isCleared: boolean }
>

export type ScoreAgainAction = (input: {
  assignmentId: number
  criterionId: number
  halfPoints: number | null
}) => Promise<ActionResult<{ halfPoints: number | null }>>
