import { lastFrozenMerged, mergedEntries } from '@/db/queries/mergedLists'
import type { ActingContext } from '../context'
import { isStale } from './isStale'
import { openCallPanels } from './openCallPanels'
import { panelLists } from './panelLists'

export interface OrderState {
  /** What the nights follow: nothing common while a panel has not frozen its list. */
  follows: 'waits' | 'rule' | 'meeting'
  /** Panels with proposals and no frozen list. */
  waitsFor: string[]
}

/** Which order of all panels the nights of a call follow; null where one panel alone has proposals. */
export async function readOrderState(ctx: ActingContext, slug: string): Promise<OrderState | null> {
  const { call, panels } = await openCallPanels(ctx, { slug })
  if (panels.length < 2) return null
  const lists = await panelLists(ctx.db, panels)
  const judging = lists.filter(({ proposals }) => proposals.length > 0)
  if (judging.length < 2) return null
  const waitsFor = judging.filter(({ list }) => list !== 'frozen').map(({ name }) => name)
  if (waitsFor.length > 0) return { follows: 'waits', waitsFor }
  const frozen = await lastFrozenMerged(ctx.db, call.id)
  const holds = frozen !== null && !isStale(await mergedEntries(ctx.db, frozen.id), lists)
  return { follows: holds ? 'meeting' : 'rule', waitsFor }
}
