import { panelProposals, requestLines, type RequestLine } from '@/db/queries/panel'
import { currentRanking, rankingEntries } from '@/db/queries/rankings'
import type { Database } from '@/db/client'

export interface PanelList {
  panelId: number
  name: string
  /** Proposals it judges, by review number. */
  proposals: { id: number; reviewNumber: string }[]
  list: 'none' | 'open' | 'frozen'
  rankingId: number | null
  listVersion: number | null
  /** What is ranked, the first first, without what is set aside; empty before the list has begun. */
  order: number[]
  lines: RequestLine[]
}

/** What each panel of a call judges and how its list stands. */
export async function panelLists(
  db: Database,
  panels: readonly { id: number; name: string }[],
): Promise<PanelList[]> {
  const lists: PanelList[] = []
  for (const { id, name } of panels) {
    const [proposals, ranking] = await Promise.all([panelProposals(db, id), currentRanking(db, id)])
    const judged = new Set(proposals.map((one) => one.id))
    const entries = ranking ? await rankingEntries(db, ranking.id) : []
    lists.push({
      panelId: id,
      name,
      proposals: proposals.map((one) => ({ id: one.id, reviewNumber: one.reviewNumber })),
      list: ranking === null ? 'none' : ranking.frozen_at === null ? 'open' : 'frozen',
      rankingId: ranking?.id ?? null,
      listVersion: ranking?.ranking_version ?? null,
      order: entries
        .filter((entry) => entry.set_aside_at === null && judged.has(entry.proposal_id))
        .map((entry) => entry.proposal_id),
      lines: await requestLines(db, [...judged]),
    })
  }
  return lists
}
