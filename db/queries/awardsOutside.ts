import type { Database } from '../client.ts'

export interface OutsideAward {
  proposalId: number
  instrumentId: number
  telescopeId: number
  seconds: number
}

/** What standing lines give in the queue of a call to all but some proposals; no reserve, and no visits, which have dates. */
export async function awardsOutside(
  db: Database,
  callId: number,
  proposalIds: readonly number[],
): Promise<OutsideAward[]> {
  return db('award_lines as a')
    .join('decisions as d', 'd.id', 'a.decision_id')
    .join('proposals as p', 'p.id', 'd.proposal_id')
    .join('instruments as i', 'i.id', 'a.instrument_id')
    .where({ 'p.call_id': callId, 'a.is_reserve': 0, 'a.service': 'queue' })
    .whereNotIn('p.id', proposalIds)
    .whereNull('d.superseded_at')
    .whereNull('a.superseded_at')
    .orderBy(['p.id', 'a.instrument_id'])
    .select<OutsideAward[]>({
      proposalId: 'p.id',
      instrumentId: 'a.instrument_id',
      telescopeId: 'i.telescope_id',
      seconds: 'a.seconds',
    })
}
