import type { Database } from '../client.ts'

export interface AwardedProposal {
  id: number
  reference: string
}

/** Proposals of a call with a standing award made known, in the order of their panels' rankings. */
export async function awardedProposals(db: Database, callId: number): Promise<AwardedProposal[]> {
  return db('proposals as p')
    .join('decisions as d', 'd.proposal_id', 'p.id')
    .leftJoin('rankings as r', (on) => void on.on('r.panel_id', 'p.panel_id').andOnNull('r.superseded_at'))
    .leftJoin(
      'ranking_entries as e',
      (on) => void on.on('e.ranking_id', 'r.id').andOn('e.proposal_id', 'p.id'),
    )
    .where('p.call_id', callId)
    .whereNull('d.superseded_at')
    .whereNotNull('d.released_at')
    .whereExists(db('award_lines as a').whereRaw('a.decision_id = d.id').whereNull('a.superseded_at'))
    .orderBy(['e.place', 'p.panel_id', 'p.id'])
    .select<AwardedProposal[]>('p.id', 'p.reference')
}
