import { findOwner, lockOwner, type Owner } from '@/db/queries/facilityOwners'
import { retirementDates } from '@/db/queries/retirements'
import type { Database } from '@/db/client'
import { refuse } from '@/lib/errors'
import type { FacilityKind } from './types'

/** What is to carry something new, locked; refused at its field when there is none, or it is retired by now. */
export async function carrierIn(db: Database, kind: FacilityKind, slug: string, now: Date): Promise<Owner> {
  const owner = await findOwner(db, kind, slug)
  if (!owner || !(await lockOwner(db, kind, owner.id))) throw refuse.field('of', `There is no such ${kind}.`)
  const retiredFrom = (await retirementDates(db, kind)).get(owner.id)
  if (retiredFrom !== undefined && retiredFrom <= now.toISOString().slice(0, 10))
    throw refuse.field('of', `${owner.name} is retired.`)
  return owner
}
