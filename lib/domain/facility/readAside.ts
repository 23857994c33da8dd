import { allOwners } from '@/db/queries/facilityOwners'
import { firstEvenings } from '@/db/queries/facilityRecords'
import { retirementDates } from '@/db/queries/retirements'
import type { Database } from '@/db/client'
import type { FacilityKind } from './types'

/** Something of the facility that is not in service on a day. */
export interface Aside {
  kind: FacilityKind
  slug: string
  name: string
  /** First evening it is no longer there, or first evening of its first record. */
  retiredFrom: string | null
  beginsOn: string | null
}

const kinds: readonly FacilityKind[] = ['site', 'telescope', 'instrument', 'mode']

/**
 * What is retired on a date, with what goes with its carrier, and sites and telescopes that have no record in force
 * yet; modes still to come stand with their instruments.
 */
export async function readAside(db: Database, onDate: string): Promise<Aside[]> {
  const found = await Promise.all(
    kinds.map(async (kind) => {
      const [owners, dates, begin] = await Promise.all([
        allOwners(db, kind),
        retirementDates(db, kind),
        kind === 'site' || kind === 'telescope' ? firstEvenings(db, kind) : new Map<number, string>(),
      ])
      return owners.flatMap(({ id, slug, name }): Aside[] => {
        const [retiredFrom, beginsOn] = [dates.get(id) ?? null, begin.get(id) ?? null]
        if (retiredFrom !== null && retiredFrom <= onDate)
          return [{ kind, slug, name, retiredFrom, beginsOn: null }]
        if (beginsOn !== null && beginsOn > onDate) return [{ kind, slug, name, retiredFrom: null, beginsOn }]
        return []
      })
    }),
  )
  return found.flat()
}
