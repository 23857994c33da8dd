import type { ActionResult } from '@/lib/actions/result'

interface ListKey {
  panelId: number
  rankingId: number
  version: number
}

/** The deeds of the ranking page, handed down from its actions. */
export interface RankingActions {
  start: (input: { panelId: number }) => Promise<ActionResult<void>>
  move: (
    input: ListKey & { proposalId: number; place: string; reason: string },
  ) => Promise<ActionResult<void>>
  line: (input: ListKey & { direction: 'up' | 'down' }) => Promise<ActionResult<void>>
  formula: (input: { panelId: number; formula: string }) => Promise<ActionResult<void>>
  freeze: (input: ListKey) => Promise<ActionResult<void>>
}
