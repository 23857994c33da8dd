import type { PaperRepair } from '../../lib/domain/papers/repairTypes.ts'
import type { Database } from '../client.ts'
import { utcNow } from '../utcNow.ts'

const columns = {
  id: 'r.id',
  kind: 'r.paper_kind',
  reason: 'r.reason',
  openedAt: 'r.created_at',
  openedBy: 'p.name',
  openUntil: 'r.open_until',
  takenBackAt: 'r.taken_back_at',
  versionNumber: 'v.version_number',
} as const

const repairs = (db: Database, proposalId: number) =>
  db('paper_repairs as r')
    .join('people as p', 'p.id', 'r.opened_by')
    .leftJoin('proposal_versions as v', 'v.id', 'r.version_id')
    .where('r.proposal_id', proposalId)
    .orderBy('r.id', 'desc')

/** Papers of a proposal that the office opened for a replacement, the newest first. */
export async function repairsOf(db: Database, proposalId: number): Promise<PaperRepair[]> {
  return (await repairs(db, proposalId).select(columns)) as PaperRepair[]
}

export async function insertRepair(
  db: Database,
  given: {
    proposalId: number
    kind: PaperRepair['kind']
    reason: string
    openedBy: number
    openUntil: Date
  },
): Promise<number> {
  const [id] = await db('paper_repairs').insert({
    proposal_id: given.proposalId,
    paper_kind: given.kind,
    reason: given.reason,
    opened_by: given.openedBy,
    open_until: given.openUntil,
  })
  return Number(id)
}

/** Closes a repair nobody has used; false when it was used or closed meanwhile. */
export async function takeBackRepair(db: Database, id: number): Promise<boolean> {
  const count = await db('paper_repairs')
    .where({ id })
    .whereNull('version_id')
    .whereNull('taken_back_at')
    .update({ taken_back_at: utcNow(db) })
  return count === 1
}

/** Marks a repair as used by a version, if it is unused and was open when the file arrived. */
export async function useRepair(
  db: Database,
  id: number,
  used: { versionId: number; arrivedAt: Date },
): Promise<boolean> {
  const count = await db('paper_repairs')
    .where({ id })
    .whereNull('version_id')
    .whereNull('taken_back_at')
    .andWhere('open_until', '>', used.arrivedAt)
    .update({ version_id: used.versionId })
  return count === 1
}
