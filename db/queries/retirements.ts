import type { Knex } from 'knex'
import type { FacilityKind } from '../../lib/domain/facility/types.ts'
import type { Database } from '../client.ts'

/** Where each kind stands in the tree of the facility, and the column of a retirement that names it. */
const places = {
  site: { key: 's.id', column: 'site_id' },
  telescope: { key: 't.id', column: 'telescope_id' },
  instrument: { key: 'i.id', column: 'instrument_id' },
  mode: { key: 'm.id', column: 'mode_id' },
} as const satisfies Record<FacilityKind, { key: string; column: string }>

const carriers: readonly FacilityKind[] = ['site', 'telescope', 'instrument', 'mode']

/** Retirements `r` joined to the tree: of one of the kind itself, or of anything that carries it. */
function joinRetirements(query: Knex.QueryBuilder, kind: FacilityKind): Knex.QueryBuilder {
  const upTo = carriers.slice(0, carriers.indexOf(kind) + 1)
  return query.join('facility_retirements as r', (on) => {
    for (const one of upTo) void on.orOn(`r.${places[one].column}`, places[one].key)
  })
}

const tree = (db: Database): Knex.QueryBuilder =>
  db('sites as s')
    .leftJoin('telescopes as t', 't.site_id', 's.id')
    .leftJoin('instruments as i', 'i.telescope_id', 't.id')
    .leftJoin('instrument_modes as m', 'm.instrument_id', 'i.id')

/** Keys of those of a kind that are retired by an evening, to be used within a query. */
export const retiredIds = (db: Database, kind: FacilityKind, by: string): Knex.QueryBuilder =>
  joinRetirements(tree(db), kind)
    .where('r.retired_from', '<=', by)
    .whereNotNull(places[kind].key)
    .select(places[kind].key)

/** First evening each of a kind is no longer there, by its own retirement or that of what carries it, by key. */
export async function retirementDates(db: Database, kind: FacilityKind): Promise<Map<number, string>> {
  const rows = (await joinRetirements(tree(db), kind)
    .whereNotNull(places[kind].key)
    .groupBy(places[kind].key)
    .select({ id: places[kind].key })
    .min({ retired_from: 'r.retired_from' })) as { id: number; retired_from: string }[]
  return new Map(rows.map((row) => [row.id, row.retired_from]))
}

/** First evening one is no longer there by a retirement of its own; null where it has none. */
export async function ownRetirement(db: Database, kind: FacilityKind, id: number): Promise<string | null> {
  const row = await db('facility_retirements')
    .where({ [places[kind].column]: id })
    .first('retired_from')
  return row?.retired_from ?? null
}

/** Writes or moves a retirement. */
export async function setRetirement(
  db: Database,
  kind: FacilityKind,
  id: number,
  from: string,
): Promise<void> {
  const where = { [places[kind].column]: id }
  const moved = await db('facility_retirements').where(where).update({ retired_from: from })
  if (moved === 0) await db('facility_retirements').insert({ ...where, retired_from: from })
}

export async function deleteRetirement(db: Database, kind: FacilityKind, id: number): Promise<void> {
  await db('facility_retirements')
    .where({ [places[kind].column]: id })
    .delete()
}

export interface CallOffer {
  number: number
  slug: string
  seasonTo: string
  /** It has not closed: what it offers can still change. */
  isOpen: boolean
  /** Names of the modes under it that the call offers. */
  modes: string[]
}

/** Calls whose season is not over and that offer modes under one of the facility, with those modes. */
export async function offersOf(
  db: Database,
  kind: FacilityKind,
  id: number,
  now: Date,
): Promise<CallOffer[]> {
  const rows = (await db('call_modes as c')
    .join('calls as k', 'k.id', 'c.call_id')
    .join('instrument_modes as m', 'm.id', 'c.mode_id')
    .join('instruments as i', 'i.id', 'm.instrument_id')
    .join('telescopes as t', 't.id', 'i.telescope_id')
    .join('sites as s', 's.id', 't.site_id')
    .where(places[kind].key, id)
    .andWhere('k.season_to', '>=', now.toISOString().slice(0, 10))
    .orderBy(['k.number', 'm.id'])
    .select('k.number', 'k.slug', 'k.season_to', 'm.name', {
      is_open: db.raw(`k.stage = 'planned' OR (k.stage = 'published' AND k.closes_at > ?)`, [now]),
    })) as { number: number; slug: string; season_to: string; name: string; is_open: number }[]
  return [...new Map(rows.map((row) => [row.number, row])).values()].map((call) => ({
    number: call.number,
    slug: call.slug,
    seasonTo: call.season_to,
    isOpen: Boolean(call.is_open),
    modes: rows.filter(({ number }) => number === call.number).map(({ name }) => name),
  }))
}

/**
 * Locks the calls that can still change their offer, as whoever changes one does and before anything else is read,
 * so that a retirement and an offer cannot miss each other.
 */
export async function lockOpenCalls(db: Database, now: Date): Promise<void> {
  await db('calls')
    .where({ stage: 'planned' })
    .orWhere((q) => void q.where({ stage: 'published' }).andWhere('closes_at', '>', now))
    .orderBy('id')
    .forUpdate()
    .select('id')
}
