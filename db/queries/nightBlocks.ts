import type { NightBlock } from '../../lib/domain/calls/nightBlock.ts'
import type { Database } from '../client.ts'

/** What each part of each night of a call is for, by telescope, evening and part; of one telescope where one is given. */
export async function nightBlocksOf(
  db: Database,
  callId: number,
  telescopeId?: number,
): Promise<NightBlock[]> {
  const rows = await db('night_blocks')
    .where({ call_id: callId, ...(telescopeId === undefined ? {} : { telescope_id: telescopeId }) })
    .orderBy(['telescope_id', 'evening_date', 'fraction_from'])
  return rows.map((row) => ({
    telescopeId: row.telescope_id,
    instrumentId: row.instrument_id,
    eveningDate: row.evening_date,
    useFor: row.use_for,
    from: Number(row.fraction_from),
    to: Number(row.fraction_to),
    note: row.note,
    darkSeconds: row.dark_seconds,
  }))
}

export async function insertNightBlocks(
  db: Database,
  callId: number,
  blocks: readonly NightBlock[],
): Promise<void> {
  await db.batchInsert(
    'night_blocks',
    blocks.map((block) => ({
      call_id: callId,
      telescope_id: block.telescopeId,
      instrument_id: block.instrumentId,
      evening_date: block.eveningDate,
      use_for: block.useFor,
      fraction_from: block.from,
      fraction_to: block.to,
      note: block.note,
      dark_seconds: block.darkSeconds,
    })) as never,
    200,
  )
}

/** Takes away what these evenings of a telescope are for. */
export async function deleteNightBlocks(
  db: Database,
  callId: number,
  telescopeId: number,
  evenings: readonly string[],
): Promise<void> {
  await db('night_blocks')
    .where({ call_id: callId, telescope_id: telescopeId })
    .whereIn('evening_date', [...evenings])
    .delete()
}
