import { databaseNow } from '@/db/queries/clock'
import { allOwners } from '@/db/queries/facilityOwners'
import { authorize } from '@/lib/auth/authorize'
import type { Context } from '../context'
import { inService } from './inService'
import { mayEditFacility } from './policy'

export interface Carrier {
  slug: string
  name: string
}

/** Sites that may carry a telescope, or telescopes that may carry an instrument. */
export async function readCarriers(
  ctx: Context,
  kind: 'site' | 'telescope',
): Promise<{ carriers: Carrier[]; today: string }> {
  authorize(mayEditFacility(ctx.actor))
  const today = (await databaseNow(ctx.db)).toISOString().slice(0, 10)
  const owners = await inService(ctx.db, kind, await allOwners(ctx.db, kind), today)
  return { carriers: owners.map(({ slug, name }) => ({ slug, name })), today }
}
