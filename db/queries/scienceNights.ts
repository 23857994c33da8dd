import type { Database } from '../client.ts'

/** A part of a night of a call that is for science: fractions of its dark time, and who may use it. */
export interface ScienceNight {
  telescopeId: number
  /** The instrument mounted; null where any may be used. */
  instrumentId: number | null
  date: string
  from: number
  to: number
}

/** Nights for science of a call, by telescope and evening. */
export async function scienceNights(db: Database, callId: number): Promise<ScienceNight[]> {
  const rows = await db('night_blocks')
    .where({ call_id: callId, use_for: 'science' })
    .orderBy(['telescope_id', 'evening_date', 'fraction_from'])
  return rows.map((row) => ({
    telescopeId: row.telescope_id,
    instrumentId: row.instrument_id,
    date: row.evening_date,
    from: Number(row.fraction_from),
    to: Number(row.fraction_to),
  }))
}
