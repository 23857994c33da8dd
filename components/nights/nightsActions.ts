import type { ActionResult } from '@/lib/actions/result'
import type { ChoiceOrRank } from '@/lib/domain/decisions/choiceWords'
import type { NightsPolicy } from '@/lib/domain/decisions/policyWords'
import type { Trial } from '@/lib/domain/decisions/trialSchema'

export type SaveAwardAction = (input: {
  panelId: number
  proposalId: number
  version: number
  lines: {
    instrumentId: number
    hours: string
    isReserve: boolean
    service: 'queue' | 'visitor'
    evenings: string
    conditions: string
  }[]
}) => Promise<ActionResult<void>>

export type TakePlanAction = (input: {
  panelId: number
  policy: NightsPolicy
  trial?: Trial
  reason?: string
}) => Promise<ActionResult<{ awarded: number }>>

export type ChooseNightsAction = (input: {
  panelId: number
  proposalId: number
  choice: ChoiceOrRank
  reason: string
}) => Promise<ActionResult<void>>

export type HoldHoursAction = (input: {
  panelId: number
  telescopeId: number
  hours: string
  reason: string
}) => Promise<ActionResult<void>>

export type SetLeastAction = (input: {
  panelId: number
  proposalId: number
  instrumentId: number
  hours: string
  reason: string
}) => Promise<ActionResult<void>>

/** What the chair may do on the page of nights. */
export interface NightsActions {
  save: SaveAwardAction
  takePlan: TakePlanAction
  choose: ChooseNightsAction
  hold: HoldHoursAction
  setLeast: SetLeastAction
}
