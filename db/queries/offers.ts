import type { Database } from '../client.ts'
import { retiredIds } from './retirements.ts'

/** Whether a call offers a mode at all. */
export async function offersAnyMode(db: Database, callId: number): Promise<boolean> {
  return (await db('call_modes').where({ call_id: callId }).first('id')) !== undefined
}

export interface OfferedMode {
  id: number
  slug: string
  name: string
  instrument: string
  isOffered: boolean
  /** Proposals of the call that observe with it; what was put away does not count. */
  proposals: number
}

/**
 * Every mode of the call's site that has a record as the season begins and does not retire before it ends, and
 * whatever is on offer: whether the call offers it, and how many of its proposals observe with it.
 */
export async function modesForOffer(
  db: Database,
  call: { id: number; siteId: number; seasonFrom: string; seasonTo: string },
): Promise<OfferedMode[]> {
  const rows = (await db('instrument_modes as m')
    .join('instruments as i', 'i.id', 'm.instrument_id')
    .join('telescopes as t', 't.id', 'i.telescope_id')
    .leftJoin('call_modes as c', (on) => void on.on('c.mode_id', 'm.id').andOnVal('c.call_id', call.id))
    .where('t.site_id', call.siteId)
    .andWhere((q) => {
      const isThere = (table: 'mode_records' | 'telescope_records') =>
        db(table).where('valid_from', '<=', call.seasonFrom)
      void q.whereNotNull('c.id').orWhere((free) => {
        void free
          .whereNotIn('m.id', retiredIds(db, 'mode', call.seasonTo))
          .whereIn('m.id', isThere('mode_records').select('mode_id'))
          .whereIn('t.id', isThere('telescope_records').select('telescope_id'))
      })
    })
    .orderBy(['t.id', 'i.id', 'm.id'])
    .select('m.id', 'm.slug', 'm.name', {
      instrument: 'i.name',
      offer: 'c.id',
      proposals: db('observations as o')
        .join('proposals as p', 'p.id', 'o.proposal_id')
        .where('p.call_id', call.id)
        .whereNot('p.state', 'withdrawn')
        .andWhereRaw('o.mode_id = m.id')
        .countDistinct('p.id'),
    })) as {
    id: number
    slug: string
    name: string
    instrument: string
    offer: number | null
    proposals: number | string
  }[]
  return rows.map(({ offer, proposals, ...mode }) => ({
    ...mode,
    isOffered: offer !== null,
    proposals: Number(proposals),
  }))
}

/** Puts modes on offer in a call and takes others off. */
export async function changeOffer(
  db: Database,
  callId: number,
  change: { add: readonly number[]; remove: readonly number[] },
): Promise<void> {
  if (change.remove.length > 0)
    await db('call_modes').where({ call_id: callId }).whereIn('mode_id', change.remove).delete()
  for (const modeId of change.add) await db('call_modes').insert({ call_id: callId, mode_id: modeId })
}
