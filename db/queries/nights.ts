import type { Database } from '../client.ts'

export interface TelescopeOffer {
  telescopeId: number
  telescope: string
  apertureM: number
  instruments: string[]
  nights: number
  darkSeconds: number
}

/** What a call offers on each telescope: science nights and their dark time, instruments with a mode on offer. */
export async function offerOfCall(db: Database, callId: number): Promise<TelescopeOffer[]> {
  const [blocks, records, instruments] = await Promise.all([
    db('night_blocks as n')
      .join('telescopes as t', 't.id', 'n.telescope_id')
      .where({ 'n.call_id': callId, 'n.use_for': 'science' })
      .groupBy('t.id', 't.name')
      .orderBy('t.id')
      .select<{ id: number; name: string; nights: string; dark_seconds: string }[]>(
        't.id',
        't.name',
        db.raw('SUM(n.fraction_to - n.fraction_from) AS nights'),
        db.raw('SUM(n.dark_seconds) AS dark_seconds'),
      ),
    db('telescope_records').orderBy('record_version').select('telescope_id', 'aperture_m'),
    db('call_modes as c')
      .join('instrument_modes as m', 'm.id', 'c.mode_id')
      .join('instruments as i', 'i.id', 'm.instrument_id')
      .where('c.call_id', callId)
      .distinct<{ id: number; name: string; telescope_id: number }[]>('i.id', 'i.name', 'i.telescope_id')
      .orderBy('i.id'),
  ])
  const aperture = new Map(records.map((row) => [row.telescope_id, row.aperture_m]))
  return blocks.map((row) => ({
    telescopeId: row.id,
    telescope: row.name,
    apertureM: aperture.get(row.id) ?? 0,
    instruments: instruments.filter((i) => i.telescope_id === row.id).map((i) => i.name),
    nights: Number(row.nights),
    darkSeconds: Number(row.dark_seconds),
  }))
}

export interface ScienceBlock {
  telescopeId: number
  /** Mounted that night, where that is set. */
  instrumentId: number | null
  eveningDate: string
  /** Part of the dark time, as fractions of it. */
  from: number
  to: number
}

/** Parts of nights that a call gives to science, in the order of their evenings. */
export async function scienceBlocks(db: Database, callId: number): Promise<ScienceBlock[]> {
  const rows = await db('night_blocks')
    .where({ call_id: callId, use_for: 'science' })
    .orderBy(['evening_date', 'telescope_id', 'fraction_from'])
  return rows.map((row) => ({
    telescopeId: row.telescope_id,
    instrumentId: row.instrument_id,
    eveningDate: row.evening_date,
    from: Number(row.fraction_from),
    to: Number(row.fraction_to),
  }))
}
