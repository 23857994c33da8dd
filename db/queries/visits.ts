import type { VisitHalvesRow } from '../tables.ts'
import type { Database } from '../client.ts'

export interface StandingHalf {
  proposalId: number
  instrumentId: number
  telescopeId: number
  date: string
  half: VisitHalvesRow['half']
  seconds: number
}

/** Halves of nights that standing visits of a call have, in the order of time. */
export function standingHalves(db: Database, callId: number): Promise<StandingHalf[]> {
  return db('visit_halves as v')
    .join('award_lines as a', 'a.id', 'v.award_line_id')
    .join('decisions as d', 'd.id', 'a.decision_id')
    .where({ 'v.call_id': callId, 'v.holds': 1 })
    .orderBy(['v.evening_date', 'v.half', 'v.telescope_id'])
    .select<StandingHalf[]>({
      proposalId: 'd.proposal_id',
      instrumentId: 'a.instrument_id',
      telescopeId: 'v.telescope_id',
      date: 'v.evening_date',
      half: 'v.half',
      seconds: 'v.seconds',
    })
}

/** The same of one proposal. */
export async function halvesOfProposal(db: Database, proposalId: number): Promise<StandingHalf[]> {
  const row = await db('proposals').where({ id: proposalId }).first('call_id')
  const all = row ? await standingHalves(db, row.call_id) : []
  return all.filter((half) => half.proposalId === proposalId)
}

export async function insertHalves(
  db: Database,
  callId: number,
  awardLineId: number,
  halves: readonly { telescope: number; date: string; half: VisitHalvesRow['half']; seconds: number }[],
): Promise<void> {
  await db('visit_halves').insert(
    halves.map(({ telescope, date, half, seconds }) => ({
      award_line_id: awardLineId,
      call_id: callId,
      telescope_id: telescope,
      evening_date: date,
      ...{ half, seconds },
    })),
  )
}

/** Gives back the nights of a decision's visits. */
export async function releaseHalves(db: Database, decisionId: number): Promise<void> {
  await db('visit_halves')
    .whereIn('award_line_id', db('award_lines').where({ decision_id: decisionId }).select('id'))
    .whereNotNull('holds')
    .update({ holds: null })
}
