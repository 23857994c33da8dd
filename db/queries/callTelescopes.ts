import type { Database } from '../client.ts'

export interface CallTelescope {
  id: number
  slug: string
  name: string
  instruments: { id: number; name: string }[]
}

/** Telescopes of a site with their instruments: what the night calendar of a call there can be about. */
export async function telescopesOfSite(db: Database, siteId: number): Promise<CallTelescope[]> {
  const [telescopes, instruments] = await Promise.all([
    db('telescopes').where({ site_id: siteId }).orderBy('id').select('id', 'slug', 'name'),
    db('instruments as i')
      .join('telescopes as t', 't.id', 'i.telescope_id')
      .where('t.site_id', siteId)
      .orderBy('i.id')
      .select('i.id', 'i.name', 'i.telescope_id'),
  ])
  return telescopes.map((telescope) => ({
    ...telescope,
    instruments: instruments
      .filter((one) => one.telescope_id === telescope.id)
      .map(({ id, name }) => ({ id, name })),
  }))
}

/** Time awarded in a call on each telescope, reserves apart, in seconds. */
export async function awardedByTelescope(db: Database, callId: number): Promise<Map<number, number>> {
  const rows = (await db('award_lines as a')
    .join('decisions as d', 'd.id', 'a.decision_id')
    .join('proposals as p', 'p.id', 'd.proposal_id')
    .join('instruments as i', 'i.id', 'a.instrument_id')
    .where({ 'p.call_id': callId, 'a.is_reserve': 0, 'd.outcome': 'awarded' })
    .whereNull('d.superseded_at')
    .whereNull('a.superseded_at')
    .groupBy('i.telescope_id')
    .select('i.telescope_id as telescopeId')
    .sum({ seconds: 'a.seconds' })) as unknown as { telescopeId: number; seconds: number | string }[]
  return new Map(rows.map(({ telescopeId, seconds }) => [telescopeId, Number(seconds)]))
}
