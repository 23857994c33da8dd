import type { ActionResult } from '@/lib/actions/result'
import type { Saved } from '@/lib/domain/proposals/writeProposal'

/** What can be done with figures; the page gives it to those who may. */
export interface FigureActions {
  save: (input: {
    reference: string
    id: number
    version: number
    label: string
    caption: string
  }) => Promise<ActionResult<Saved>>
  move: (input: { reference: string; id: number; by: -1 | 1 }) => Promise<ActionResult<unknown>>
  remove: (input: { reference: string; id: number }) => Promise<ActionResult<unknown>>
}
