import type { ActionResult } from '@/lib/actions/result'

export type SetAsideAction = (input: {
  panelId: number
  rankingId: number
  version: number
  proposalIds: number[]
  aside: boolean
}) => Promise<ActionResult<void>>

export type SaveStatementAction = (input: {
  panelId: number
  proposalId: number
  version: number
  statement: string
}) => Promise<ActionResult<{ version: number }>>
