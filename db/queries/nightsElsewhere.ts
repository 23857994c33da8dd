import type { NightElsewhere } from '../../lib/domain/calendar/nightElsewhere.ts'
import type { Database } from '../client.ts'

/** Locks telescopes, in the order of their keys, so that two calls cannot take one night at one moment. */
export async function lockTelescopes(db: Database, telescopeIds: readonly number[]): Promise<void> {
  await db('telescopes')
    .whereIn('id', [...telescopeIds])
    .orderBy('id')
    .forUpdate()
    .select('id')
}

/** Parts of nights that calls other than one offer for science on a telescope, by night. */
export async function nightsElsewhere(
  db: Database,
  asked: { telescopeId: number; from: string; to: string; exceptCallId: number },
): Promise<NightElsewhere[]> {
  const rows = await db('night_blocks as b')
    .join('calls as c', 'c.id', 'b.call_id')
    .where({ 'b.telescope_id': asked.telescopeId, 'b.use_for': 'science' })
    .whereBetween('b.evening_date', [asked.from, asked.to])
    .whereNot('b.call_id', asked.exceptCallId)
    .orderBy(['b.evening_date', 'b.fraction_from'])
    .select<{ evening_date: string; fraction_from: string; fraction_to: string; number: number }[]>(
      'b.evening_date',
      'b.fraction_from',
      'b.fraction_to',
      'c.number',
    )
  return rows.map((row) => ({
    eveningDate: row.evening_date,
    from: Number(row.fraction_from),
    to: Number(row.fraction_to),
    callNumber: row.number,
  }))
}
