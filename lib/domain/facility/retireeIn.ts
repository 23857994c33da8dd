import { findOwner, lockOwner, type Owner } from '@/db/queries/facilityOwners'
import { lastChangeOf } from '@/db/queries/logbook'
import { ownRetirement } from '@/db/queries/retirements'
import type { Database } from '@/db/client'
import { refuse } from '@/lib/errors'
import type { KeepForm } from './retireSchema'

/** What retires or stays, locked, as long as its retirement is what the page showed. */
export async function retireeIn(
  db: Database,
  { kind, slug, before }: Pick<KeepForm, 'kind' | 'slug' | 'before'>,
  now: Date,
): Promise<Owner> {
  const owner = await findOwner(db, kind, slug)
  if (!owner || !(await lockOwner(db, kind, owner.id))) throw refuse.notFound(kind)
  const retiredFrom = await ownRetirement(db, kind, owner.id)
  if (retiredFrom === before) return owner
  const last = await lastChangeOf(db, kind, slug)
  throw refuse.stale({
    changedBy: last?.name ?? 'Someone else in the office',
    changedAt: (last?.at ?? now).toISOString(),
    version: 1,
    theirs: { retiredFrom },
  })
}
