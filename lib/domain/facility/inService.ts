import { retirementDates } from '@/db/queries/retirements'
import type { Database } from '@/db/client'
import type { FacilityKind } from './types'

/** Of sites, telescopes, instruments or modes, those that are not retired on a date, `YYYY-MM-DD`. */
export async function inService<O extends { id: number }>(
  db: Database,
  kind: FacilityKind,
  owners: readonly O[],
  onDate: string,
): Promise<O[]> {
  const dates = await retirementDates(db, kind)
  return owners.filter(({ id }) => (dates.get(id) ?? '9999') > onDate)
}
