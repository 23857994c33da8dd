import { findOwner, isNameTaken } from '@/db/queries/facilityOwners'
import type { Database } from '@/db/client'
import { refuse } from '@/lib/errors'
import { isDuplicate } from '../isDuplicate'
import type { FacilityKind } from './types'

interface New {
  kind: FacilityKind
  slug: string
  name: string
  /** Key of what carries it; 0 for a site. */
  carrierId: number
}

/** Inserts something new under names nobody else has: refused at the field otherwise. Gives its key. */
export async function putIn(
  db: Database,
  { kind, slug, name, carrierId }: New,
  insert: () => Promise<number>,
): Promise<number> {
  const taken = () => refuse.field('slug', `Another ${kind} has this short name.`)
  if (await findOwner(db, kind, slug)) throw taken()
  if (await isNameTaken(db, kind, name, carrierId))
    throw refuse.field('name', `Another ${kind} has this name${kind === 'site' ? '' : ' there'}.`)
  return insert().catch((error: unknown) => {
    // Somebody came between the look and the row.
    throw isDuplicate(error) ? taken() : error
  })
}
