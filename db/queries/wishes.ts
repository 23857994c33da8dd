import type { ServiceWish } from '@/lib/domain/proposals/types'
import type { Database } from '../client.ts'
import type { ServiceWishesRow } from '../tables.ts'

export type WishValues = Pick<ServiceWish, 'leastSeconds' | 'visit'>

const wishOf = (row: ServiceWishesRow): ServiceWish => ({
  id: row.id,
  instrumentId: row.instrument_id,
  leastSeconds: row.least_seconds,
  visit:
    row.visit_nights === null
      ? null
      : { nights: row.visit_nights, part: row.visit_part, together: Boolean(row.visit_together) },
  version: row.version,
})

const columnsOf = ({ leastSeconds, visit }: WishValues) => ({
  least_seconds: leastSeconds,
  visit_nights: visit?.nights ?? null,
  visit_part: visit?.part ?? ('whole' as const),
  visit_together: visit === null || visit.together ? (1 as const) : (0 as const),
})

/** How a draft wishes to be given time, by instrument. */
export async function wishesOf(db: Database, proposalId: number): Promise<ServiceWish[]> {
  const rows = await db('service_wishes').where({ proposal_id: proposalId }).orderBy('instrument_id')
  return rows.map(wishOf)
}

export async function insertWish(
  db: Database,
  proposalId: number,
  instrumentId: number,
  values: WishValues,
): Promise<number> {
  const [id = 0] = await db('service_wishes').insert({
    proposal_id: proposalId,
    instrument_id: instrumentId,
    ...columnsOf(values),
  })
  return id
}

/** Writes a wish that still has the version it was read with; false when someone was first. */
export async function updateWish(
  db: Database,
  wish: Pick<ServiceWish, 'id' | 'version'>,
  values: WishValues,
): Promise<boolean> {
  const changed = await db('service_wishes')
    .where({ id: wish.id, version: wish.version })
    .update({ ...columnsOf(values), version: wish.version + 1 })
  return changed > 0
}

export interface SentWish extends WishValues {
  proposalId: number
  instrumentId: number
}

/** What the standing versions of proposals wish, instrument by instrument; none of those from before they could. */
export async function sentWishes(db: Database, proposalIds: readonly number[]): Promise<SentWish[]> {
  if (proposalIds.length === 0) return []
  const [rows] = (await db.raw(
    `SELECT v.proposal_id AS proposalId, w.instrument AS instrumentId, w.least AS leastSeconds,
            w.nights, w.part, w.together
       FROM proposal_versions v
       JOIN JSON_TABLE(v.snapshot, '$.contents.wishes[*]'
              COLUMNS (instrument INT PATH '$.instrumentId', least INT PATH '$.leastSeconds',
                       nights INT PATH '$.visit.nights', part VARCHAR(10) PATH '$.visit.part',
                       together INT PATH '$.visit.together')) w
      WHERE v.proposal_id IN (${proposalIds.map(() => '?').join(', ')}) AND v.superseded_at IS NULL
      ORDER BY v.proposal_id, w.instrument`,
    [...proposalIds],
  )) as [
    {
      proposalId: number
      instrumentId: number
      leastSeconds: number | null
      nights: number | null
      part: 'whole' | 'first' | 'second' | null
      together: number | null
    }[],
  ]
  return rows.map(({ nights, part, together, ...row }) => ({
    ...row,
    visit: nights === null || part === null ? null : { nights, part, together: together === 1 },
  }))
}
