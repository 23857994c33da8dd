import type { ModeOwner } from '@/db/queries/facilityOwners'
import { modeVersions } from '@/db/queries/facilityRecords'
import type { Database } from '@/db/client'
import { heldRecord, type HeldRecord } from './heldRecord'
import type { ModeFacts } from './types'

export interface HeldMode extends HeldRecord<ModeFacts> {
  instrument: ModeOwner['instrument']
  telescope: string
  /** Numbers of the calls it is on offer in. */
  offeredIn: number[]
}

/** Modes with their records in force on a date. */
export async function heldModes(
  db: Database,
  owners: readonly ModeOwner[],
  onDate: string,
): Promise<HeldMode[]> {
  const held = await Promise.all(
    owners.map(async ({ id, slug, name, instrument, telescope, offeredIn }) => {
      const record = heldRecord({ slug, name }, await modeVersions(db, id), onDate)
      return record ? [{ ...record, instrument, telescope, offeredIn }] : []
    }),
  )
  return held.flat()
}
