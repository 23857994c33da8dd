import { databaseNow } from '@/db/queries/clock'
import { allInstruments, modeOwners } from '@/db/queries/facilityOwners'
import { retirementDates } from '@/db/queries/retirements'
import { holdsForInstrument } from '../actor'
import type { ActingContext } from '../context'
import { heldModes, type HeldInstrument } from './heldModes'

/** The instruments one is the scientist of and their modes, retired ones too, with their records in force today. */
export async function readOwnInstruments({ db, actor }: ActingContext): Promise<{
  instruments: HeldInstrument[]
  today: string
}> {
  const today = (await databaseNow(db)).toISOString().slice(0, 10)
  const own = (await allInstruments(db)).filter(({ id }) => holdsForInstrument(actor, id))
  const [owners, dates] = await Promise.all([
    modeOwners(db, { instrumentIds: own.map(({ id }) => id) }),
    retirementDates(db, 'instrument'),
  ])
  const modes = await heldModes(db, owners, today)
  return {
    instruments: own.map(({ id, slug, name, telescope }) => ({
      slug,
      name,
      telescope,
      retiredFrom: dates.get(id) ?? null,
      modes: modes.filter(({ instrument }) => instrument.id === id),
    })),
    today,
  }
}
