import type { Database } from '../client.ts'

export interface Candidate {
  proposalId: number
  reference: string
  callNumber: number
  modeId: number
  raDeg: number
  decDeg: number
  seconds: number
}

export interface Sought {
  /** The proposal that asks. */
  proposalId: number
  callId: number
  modeIds: readonly number[]
  /** Declinations that are looked through, degrees. */
  decFromDeg: number
  decToDeg: number
}

const observed = (db: Database, sought: Sought) =>
  db('observations as o')
    .join('targets as t', 't.id', 'o.target_id')
    .join('proposals as p', 'p.id', 'o.proposal_id')
    .join('calls as c', 'c.id', 'p.call_id')
    .whereNot('p.id', sought.proposalId)
    .whereIn('o.mode_id', [...sought.modeIds])
    .whereBetween('t.dec_deg', [sought.decFromDeg, sought.decToDeg])
    .whereNotNull('t.ra_deg')

const columns = {
  proposalId: 'p.id',
  reference: 'p.reference',
  callNumber: 'c.number',
  modeId: 'o.mode_id',
  raDeg: 't.ra_deg',
  decDeg: 't.dec_deg',
  seconds: 'o.asked_seconds',
}

/**
 * Observations of awarded proposals whose decision is made known. Nothing of a draft, of a proposal that waits for its
 * decision, or of one that was declined is ever looked at: what others ask for is theirs.
 */
export function awardedNear(db: Database, sought: Sought): Promise<Candidate[]> {
  return observed(db, sought)
    .where('p.state', 'awarded')
    .whereExists(
      db('decisions as d')
        .select('d.id')
        .whereRaw('d.proposal_id = p.id')
        .whereNull('d.superseded_at')
        .whereNotNull('d.released_at'),
    )
    .select<Candidate[]>(columns)
}

/** Observations of the other proposals that name this person: those sent or held, and drafts of the same call. */
export function ownNear(
  db: Database,
  sought: Sought,
  person: { id: number; email: string },
): Promise<Candidate[]> {
  return observed(db, sought)
    .andWhere((q) =>
      q
        .whereIn('p.state', ['submitted', 'under-review', 'awarded', 'reserve'])
        .orWhere((draft) => draft.where({ 'p.state': 'draft', 'p.call_id': sought.callId })),
    )
    .whereExists(
      db('proposal_people as q')
        .select('q.id')
        .whereRaw('q.proposal_id = p.id')
        .andWhere((named) =>
          named
            .where('q.person_id', person.id)
            .orWhere((byAddress) => byAddress.whereNull('q.person_id').andWhere('q.email', person.email)),
        ),
    )
    .select<Candidate[]>(columns)
}
