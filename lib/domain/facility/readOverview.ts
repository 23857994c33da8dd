import { databaseNow } from '@/db/queries/clock'
import { allInstruments, allOwners, modeOwners, type Owner } from '@/db/queries/facilityOwners'
import { siteVersions, telescopeVersions } from '@/db/queries/facilityRecords'
import { retirementDates } from '@/db/queries/retirements'
import { authorize } from '@/lib/auth/authorize'
import type { Database } from '@/db/client'
import type { Context } from '../context'
import { heldModes, type HeldInstrument } from './heldModes'
import { heldRecord, type HeldRecord } from './heldRecord'
import { mayEditFacility } from './policy'
import { readAside, type Aside } from './readAside'
import type { RecordVersion, SiteFacts, TelescopeFacts } from './types'

export interface FacilityOverview {
  sites: HeldRecord<SiteFacts>[]
  telescopes: HeldRecord<TelescopeFacts>[]
  instruments: HeldInstrument[]
  /** What is not in service today: still to come, or retired. */
  aside: Aside[]
  today: string
}

async function heldOwners<Facts>(
  db: Database,
  kind: 'site' | 'telescope',
  versionsOf: (db: Database, id: number) => Promise<RecordVersion<Facts>[]>,
  today: string,
): Promise<HeldRecord<Facts>[]> {
  const [owners, dates] = await Promise.all([allOwners(db, kind), retirementDates(db, kind)])
  const held = await Promise.all(
    owners.map(async (one: Owner) =>
      heldRecord(one, await versionsOf(db, one.id), today, dates.get(one.id) ?? null),
    ),
  )
  return held.filter((one) => one !== null).filter(isThere(today))
}

const isThere =
  (today: string) =>
  ({ retiredFrom }: { retiredFrom: string | null }): boolean =>
    retiredFrom === null || retiredFrom > today

/** Every record of the facility in force today, with its version, since when it holds and who wrote it. */
export async function readOverview(ctx: Context): Promise<FacilityOverview> {
  authorize(mayEditFacility(ctx.actor))
  const { db } = ctx
  const today = (await databaseNow(db)).toISOString().slice(0, 10)
  const [sites, telescopes, instruments, dates, modes, aside] = await Promise.all([
    heldOwners(db, 'site', siteVersions, today),
    heldOwners(db, 'telescope', telescopeVersions, today),
    allInstruments(db),
    retirementDates(db, 'instrument'),
    heldModes(db, await modeOwners(db, 'all'), today),
    readAside(db, today),
  ])
  return {
    sites,
    telescopes,
    instruments: instruments
      .map(({ id, slug, name, telescope }) => ({
        slug,
        name,
        telescope,
        retiredFrom: dates.get(id) ?? null,
        modes: modes.filter(({ instrument }) => instrument.id === id).filter(isThere(today)),
      }))
      .filter(isThere(today)),
    aside,
    today,
  }
}
