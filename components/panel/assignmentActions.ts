import type { ActionResult } from '@/lib/actions/result'
import type { Seat } from '@/lib/domain/assignments/schema'
import type { SuggestedPairs } from '@/lib/domain/assignments/suggestionWords'

type Pair = { proposalId: number; personId: number; seat: Seat }

/** The deeds of the assignments page, handed down from its actions. */
export interface AssignmentActions {
  startReview: (input: { callId: number }) => Promise<ActionResult<void>>
  assign: (input: { panelId: number; pairs: Pair[] }) => Promise<ActionResult<{ assignmentIds: number[] }>>
  takeOff: (input: { panelId: number; assignmentIds: number[] }) => Promise<ActionResult<{ taken: number }>>
  changeSeat: (input: { panelId: number; assignmentId: number; seat: Seat }) => Promise<ActionResult<void>>
  move: (input: {
    panelId: number
    assignmentId: number
    proposalId: number
    seat: Seat
  }) => Promise<ActionResult<{ assignmentId: number }>>
  replace: (input: {
    panelId: number
    assignmentId: number
    personId: string
    reason: string
  }) => Promise<ActionResult<{ assignmentId: number }>>
  suggest: (input: { panelId: number; each: string }) => Promise<ActionResult<SuggestedPairs>>
}
