import type { NightsPolicy } from '@/lib/domain/decisions/nightsPolicySchema'
import type { ActionResult } from '@/lib/actions/result'

export type SaveAwardAction = (input: {
  panelId: number
  proposalId: number
  version: number
  lines: {
    instrumentId: number
    hours: string
    isReserve: boolean
    service: 'queue' | 'visitor'
    conditions: string
  }[]
}) => Promise<ActionResult<void>>

export type TakePlanAction = (input: {
  panelId: number
  policy: NightsPolicy
}) => Promise<ActionResult<{ awarded: number }>>
