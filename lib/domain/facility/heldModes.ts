import type { ModeOwner } from '@/db/queries/facilityOwners'
import { modeVersions } from '@/db/queries/facilityRecords'
import { retirementDates } from '@/db/queries/retirements'
import type { Database } from '@/db/client'
import { heldRecord, type HeldRecord } from './heldRecord'
import type { ModeFacts } from './types'

export interface HeldMode extends HeldRecord<ModeFacts> {
  instrument: ModeOwner['instrument']
  telescope: string
  /** Numbers of the calls it is on offer in. */
  offeredIn: number[]
}

const firstEvening = (versions: readonly { validFrom: string }[]): string =>
  versions.map(({ validFrom }) => validFrom).toSorted()[0] ?? ''

/** An instrument as an overview shows it, with its modes. */
export interface HeldInstrument {
  slug: string
  name: string
  telescope: string
  /** First evening it is no longer there; null while it stays. */
  retiredFrom: string | null
  modes: HeldMode[]
}

/** Modes with their records in force on a date; one that has none yet stands with its first one to come. */
export async function heldModes(
  db: Database,
  owners: readonly ModeOwner[],
  onDate: string,
): Promise<HeldMode[]> {
  const dates = await retirementDates(db, 'mode')
  const held = await Promise.all(
    owners.map(async ({ id, slug, name, instrument, telescope, offeredIn }) => {
      const versions = await modeVersions(db, id)
      const asOf = (date: string) => heldRecord({ slug, name }, versions, date, dates.get(id) ?? null)
      const record = asOf(onDate) ?? asOf(firstEvening(versions))
      return record ? [{ ...record, instrument, telescope, offeredIn }] : []
    }),
  )
  return held.flat()
}
