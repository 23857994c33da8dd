import { databaseNow } from '@/db/queries/clock'
import { allOwners, modeOwners } from '@/db/queries/facilityOwners'
import { siteVersions, telescopeVersions } from '@/db/queries/facilityRecords'
import { authorize } from '@/lib/auth/authorize'
import type { Context } from '../context'
import { heldModes, type HeldMode } from './heldModes'
import { heldRecord, type HeldRecord } from './heldRecord'
import { mayEditFacility } from './policy'
import type { SiteFacts, TelescopeFacts } from './types'

export interface FacilityOverview {
  sites: HeldRecord<SiteFacts>[]
  telescopes: HeldRecord<TelescopeFacts>[]
  modes: HeldMode[]
}

/** Every record of the facility in force today, with its version, since when it holds and who wrote it. */
export async function readOverview(ctx: Context): Promise<FacilityOverview> {
  authorize(mayEditFacility(ctx.actor))
  const today = (await databaseNow(ctx.db)).toISOString().slice(0, 10)
  const [siteOwners, telescopeOwners, modes] = await Promise.all([
    allOwners(ctx.db, 'site'),
    allOwners(ctx.db, 'telescope'),
    modeOwners(ctx.db, 'all'),
  ])
  const [sites, telescopes, held] = await Promise.all([
    Promise.all(siteOwners.map(async (one) => heldRecord(one, await siteVersions(ctx.db, one.id), today))),
    Promise.all(
      telescopeOwners.map(async (one) => heldRecord(one, await telescopeVersions(ctx.db, one.id), today)),
    ),
    heldModes(ctx.db, modes, today),
  ])
  return {
    sites: sites.filter((one) => one !== null),
    telescopes: telescopes.filter((one) => one !== null),
    modes: held,
  }
}
