import { panelAssignments } from '@/db/queries/assignments'
import type { Database } from '@/db/client'
import type { PanelDesk } from '../panels/openPanel'
import { panelScores } from '../rankings/panelScores'

/** The raw mean of each proposal's scores before discussion; none for one without a score. */
export async function meritOf(db: Database, desk: PanelDesk): Promise<Map<number, number>> {
  const scores = await panelScores({ db }, desk.call.id, await panelAssignments(db, desk.panel.id))
  const sums = new Map<number, { sum: number; count: number }>()
  for (const { proposal, score } of scores) {
    const { sum, count } = sums.get(proposal) ?? { sum: 0, count: 0 }
    sums.set(proposal, { sum: sum + score, count: count + 1 })
  }
  return new Map([...sums].map(([proposal, { sum, count }]) => [proposal, sum / count]))
}
