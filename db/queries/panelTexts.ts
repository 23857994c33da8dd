import type { Database } from '../client.ts'
import { utcNow } from '../utcNow.ts'

export interface PanelText {
  proposalId: number
  personId: number
  seat: 'first' | 'second' | 'reader'
  audience: 'investigators' | 'panel'
  body: string
  assignmentId: number
  /** Why the investigators do not read it; null while they may. */
  withheldReason: string | null
}

/** Comments of finished reviews to the panel and to the investigators, first readers first. */
export async function panelTexts(db: Database, proposalIds: readonly number[]): Promise<PanelText[]> {
  const rows = await db('review_texts as x')
    .join('assignments as a', 'a.id', 'x.assignment_id')
    .whereIn('a.proposal_id', proposalIds)
    .whereIn('x.audience', ['panel', 'investigators'])
    .whereNull('a.withdrawn_at')
    .whereNotNull('a.finished_at')
    .orderByRaw("FIELD(a.seat, 'first', 'second', 'reader'), a.id")
    .select<PanelText[]>({
      proposalId: 'a.proposal_id',
      personId: 'a.person_id',
      seat: 'a.seat',
      audience: 'x.audience',
      body: 'x.body',
      assignmentId: 'a.id',
      withheldReason: 'x.withheld_reason',
    })
  return rows.filter((row) => row.body.trim() !== '')
}

/** Keeps a comment from the investigators, with the reason, or lets them read it again (null). False when there is none. */
export async function withholdText(
  db: Database,
  assignmentId: number,
  by: number,
  reason: string | null,
): Promise<boolean> {
  const count = await db('review_texts')
    .where({ assignment_id: assignmentId, audience: 'investigators' })
    .update({
      withheld_at: reason === null ? null : utcNow(db),
      withheld_by: reason === null ? null : by,
      withheld_reason: reason,
    })
  return count === 1
}
