import type { Database } from '@/db/client'
import type { ScenarioFacility } from './facility'

/** A second mode of the scenario's instrument, with the record of the first; gives its key. */
export async function makeSecondMode(
  db: Database,
  { modeId, instrumentId, tag }: Pick<ScenarioFacility, 'modeId' | 'instrumentId'> & { tag: string },
): Promise<number> {
  const [second = 0] = await db('instrument_modes').insert({
    instrument_id: instrumentId,
    slug: `second-${tag}`,
    name: 'Blue, 1.0″ slit',
  })
  const record = await db('mode_records').where({ mode_id: modeId }).first()
  if (!record) throw new Error('the first mode has no record')
  const { id: _id, ...facts } = record
  await db('mode_records').insert({ ...facts, mode_id: second })
  return second
}
