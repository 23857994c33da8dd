import type { Database } from '../client.ts'
import type { ProposalsRow } from '../tables.ts'
import { utcNow } from '../utcNow.ts'

const isKey = (which: string | number): which is number => typeof which === 'number'

/** By public reference or by key. */
export async function findProposal(db: Database, which: string | number): Promise<ProposalsRow | null> {
  const row = await db('proposals')
    .where(isKey(which) ? { id: which } : { reference: which })
    .first()
  return row ?? null
}

/** The same, locked until the transaction ends: every verb that changes a proposal or its parts begins here. */
export async function lockProposal(db: Database, which: string | number): Promise<ProposalsRow | null> {
  const row = await db('proposals')
    .where(isKey(which) ? { id: which } : { reference: which })
    .forUpdate()
    .first()
  return row ?? null
}

export async function insertProgramme(
  db: Database,
  given: { title: string; leadPersonId: number },
): Promise<number> {
  const [id] = await db('programmes').insert({ title: given.title, lead_person_id: given.leadPersonId })
  return Number(id)
}

export interface NewProposal {
  reference: string
  programmeId: number
  callId: number
  callKindId: number
  title: string
  cosmologyId: string
  cosmologyParameters: unknown
  createdBy: number
  /** Carried over from an earlier proposal. */
  abstract?: string
  category?: string
  comparisonCosmologyId?: string | null
  continuesId?: number
}

export async function insertProposal(db: Database, given: NewProposal): Promise<number> {
  const [id] = await db('proposals').insert({
    reference: given.reference,
    programme_id: given.programmeId,
    call_id: given.callId,
    call_kind_id: given.callKindId,
    title: given.title,
    abstract: given.abstract ?? '',
    category: given.category ?? '',
    cosmology_id: given.cosmologyId,
    cosmology_parameters: JSON.stringify(given.cosmologyParameters),
    comparison_cosmology_id: given.comparisonCosmologyId ?? null,
    continues_id: given.continuesId ?? null,
    sections_done: '[]',
    created_by: given.createdBy,
    updated_at: utcNow(db),
  })
  return Number(id)
}

export type ProposalChanges = Partial<
  Pick<
    ProposalsRow,
    | 'title'
    | 'abstract'
    | 'category'
    | 'cosmology_id'
    | 'cosmology_parameters'
    | 'comparison_cosmology_id'
    | 'sections_done'
    | 'state'
    | 'withdrawn_at'
    | 'withdrawn_reason'
  >
>

/** Writes a change if the proposal still stands at `version`; false when someone was first. */
export async function updateProposal(
  db: Database,
  id: number,
  version: number,
  changes: ProposalChanges,
): Promise<boolean> {
  const count = await db('proposals')
    .where({ id, version })
    .update({ ...changes, version: version + 1, updated_at: utcNow(db) })
  return count === 1
}

/** Notes that a part of the proposal changed: its targets, people, papers. */
export async function touchProposal(db: Database, id: number): Promise<void> {
  await db('proposals')
    .where({ id })
    .update({ updated_at: utcNow(db) })
}

/** Reference of a draft the same person began a moment ago with the same words; null when there is none. */
export async function findTwin(
  db: Database,
  given: { personId: number; kindId: number; title: string; continuesId?: number },
): Promise<string | null> {
  const row = await db('proposals')
    .where({ created_by: given.personId, call_kind_id: given.kindId, title: given.title, state: 'draft' })
    .modify((q) => {
      if (given.continuesId !== undefined) q.where({ continues_id: given.continuesId })
    })
    .andWhere('created_at', '>', db.raw('UTC_TIMESTAMP(3) - INTERVAL 10 SECOND'))
    .orderBy('id', 'desc')
    .first('reference')
  return row?.reference ?? null
}
