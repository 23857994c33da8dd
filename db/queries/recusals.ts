import type { Database } from '../client.ts'

export interface Recusal {
  proposalId: number
  personId: number
  name: string
  reason: string
  at: Date
}

/** Who left which proposal of a panel after it was given to them, the newest first. */
export function recusalsOf(db: Database, panelId: number): Promise<Recusal[]> {
  return db('recusals as r')
    .join('assignments as a', 'a.id', 'r.assignment_id')
    .join('people as p', 'p.id', 'a.person_id')
    .where('a.panel_id', panelId)
    .orderBy('r.id', 'desc')
    .select<Recusal[]>({
      proposalId: 'a.proposal_id',
      personId: 'a.person_id',
      name: 'p.name',
      reason: 'r.reason',
      at: 'r.created_at',
    })
}
