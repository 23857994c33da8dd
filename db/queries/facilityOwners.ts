import type { FacilityKind, RecordUse } from '../../lib/domain/facility/types.ts'
import type { Database } from '../client.ts'
import type { RecordKind } from './facilityRecords.ts'

export interface Owner {
  id: number
  slug: string
  name: string
}

export interface ModeOwner extends Owner {
  instrument: { id: number; slug: string; name: string }
  telescope: string
  /** Numbers of the calls it is on offer in. */
  offeredIn: number[]
}

const tables = {
  site: 'sites',
  telescope: 'telescopes',
  instrument: 'instruments',
  mode: 'instrument_modes',
} as const satisfies Record<FacilityKind, string>

/** A site, telescope, instrument or mode by its short name; null when there is none. */
export async function findOwner(db: Database, kind: FacilityKind, slug: string): Promise<Owner | null> {
  const row = await db(tables[kind]).where({ slug }).first<Owner | undefined>('id', 'slug', 'name')
  return row ?? null
}

/** Every site, telescope, instrument or mode. */
export function allOwners(db: Database, kind: FacilityKind): Promise<Owner[]> {
  return db(tables[kind]).orderBy('id').select<Owner[]>('id', 'slug', 'name')
}

/** Every instrument with the telescope that carries it. */
export function allInstruments(db: Database): Promise<(Owner & { telescope: string })[]> {
  return db('instruments as i')
    .join('telescopes as t', 't.id', 'i.telescope_id')
    .orderBy(['t.id', 'i.id'])
    .select<(Owner & { telescope: string })[]>('i.id', 'i.slug', 'i.name', { telescope: 't.name' })
}

const carrierColumns = {
  site: null,
  telescope: 'site_id',
  instrument: 'telescope_id',
  mode: 'instrument_id',
} as const satisfies Record<FacilityKind, string | null>

/** Whether something on the same carrier, or another site, goes by this name; capitals make no difference. */
export async function isNameTaken(
  db: Database,
  kind: FacilityKind,
  name: string,
  carrierId: number,
): Promise<boolean> {
  const column = carrierColumns[kind]
  const row = await db(tables[kind])
    .where({ name, ...(column ? { [column]: carrierId } : {}) })
    .first<{ id: number } | undefined>('id')
  return row !== undefined
}

/** Takes the lock under which one version of its record is written at a time. */
export async function lockOwner(db: Database, kind: FacilityKind, id: number): Promise<boolean> {
  const row = await db(tables[kind]).where({ id }).forUpdate().first<{ id: number } | undefined>('id')
  return row !== undefined
}

/** Modes of instruments, under one of the facility, or all, with where they belong and the calls that offer them. */
export async function modeOwners(
  db: Database,
  which: { instrumentIds: readonly number[] } | { slug: string } | { kind: FacilityKind; id: number } | 'all',
): Promise<ModeOwner[]> {
  const rows = await db('instrument_modes as m')
    .join('instruments as i', 'i.id', 'm.instrument_id')
    .join('telescopes as t', 't.id', 'i.telescope_id')
    .modify((q) => {
      if (which === 'all') return
      if ('kind' in which)
        void q.where(
          { site: 't.site_id', telescope: 't.id', instrument: 'i.id', mode: 'm.id' }[which.kind],
          which.id,
        )
      else if ('slug' in which) void q.where('m.slug', which.slug)
      else void q.whereIn('i.id', which.instrumentIds)
    })
    .orderBy(['t.id', 'i.id', 'm.id'])
    .select<
      (Owner & { telescope: string; instrument_id: number; instrument_slug: string; instrument: string })[]
    >('m.id', 'm.slug', 'm.name', {
      telescope: 't.name',
      instrument_id: 'i.id',
      instrument_slug: 'i.slug',
      instrument: 'i.name',
    })
  const offers = await db('call_modes as o')
    .join('calls as c', 'c.id', 'o.call_id')
    .whereIn(
      'o.mode_id',
      rows.map(({ id }) => id),
    )
    .orderBy('c.number')
    .select<{ mode_id: number; number: number }[]>('o.mode_id', 'c.number')
  return rows.map((row) => ({
    id: row.id,
    slug: row.slug,
    name: row.name,
    telescope: row.telescope,
    instrument: { id: row.instrument_id, slug: row.instrument_slug, name: row.instrument },
    offeredIn: offers.filter((offer) => offer.mode_id === row.id).map((offer) => offer.number),
  }))
}

interface UseRow {
  number: number
  season_from: string
  drafts: string
  sent: string
  used: string
}

/**
 * Who computes with a record: drafts whose call still takes proposals, and what was sent. A proposal uses a site by
 * its call, a telescope or mode by its observations.
 */
export async function useOfRecord(
  db: Database,
  kind: RecordKind,
  ownerId: number,
  now: Date,
): Promise<RecordUse> {
  const isOpen = `(p.state = 'draft' OR p.is_reopened = 1) AND COALESCE(p.closes_at, k.closes_at, c.closes_at) > ?`
  const observed = db('observations as o')
    .join('instrument_modes as m', 'm.id', 'o.mode_id')
    .join('instruments as i', 'i.id', 'm.instrument_id')
    .where(kind === 'mode' ? 'm.id' : 'i.telescope_id', ownerId)
    .select('o.proposal_id')
  const rows = (await db('proposals as p')
    .join('calls as c', 'c.id', 'p.call_id')
    .join('call_kinds as k', 'k.id', 'p.call_kind_id')
    .modify((q) => {
      if (kind === 'site') void q.where('c.site_id', ownerId)
      else void q.whereIn('p.id', observed)
    })
    .select('c.number', 'c.season_from', {
      drafts: db.raw(`SUM(${isOpen})`, [now]),
      sent: db.raw(`SUM(p.state NOT IN ('draft', 'withdrawn'))`),
      used: db.raw('COUNT(*)'),
    })
    .groupBy('c.id')
    .orderBy('c.number')) as UseRow[]
  return {
    drafts: rows
      .filter((row) => Number(row.drafts) > 0)
      .map((row) => ({ callNumber: row.number, seasonFrom: row.season_from, count: Number(row.drafts) })),
    sent: rows.reduce((sum, row) => sum + Number(row.sent), 0),
    wasUsed: rows.some((row) => Number(row.used) > 0),
  }
}
