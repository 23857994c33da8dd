import { databaseNow } from '@/db/queries/clock'
import { findOwner, modeOwners } from '@/db/queries/facilityOwners'
import { offersOf, ownRetirement, retirementDates, type CallOffer } from '@/db/queries/retirements'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { mayEditFacility } from './policy'
import type { FacilityKind } from './types'

export interface RetirementPage {
  kind: FacilityKind
  slug: string
  name: string
  /** First evening it is no longer there; null while it stays. */
  retiredFrom: string | null
  /** First evening it goes with what carries it, where that comes first; null where it does not. */
  goesWithCarrier: string | null
  /** Modes that go with it, the mode itself for one, and the instruments they belong to. */
  modeCount: number
  instruments: string[]
  /** Calls whose season is not over and that offer it, with the modes they offer. */
  offers: CallOffer[]
  today: string
}

/** What the page says on which something retires. */
export async function readRetirement(
  ctx: Context,
  kind: FacilityKind,
  slug: string,
): Promise<RetirementPage> {
  authorize(mayEditFacility(ctx.actor))
  const owner = await findOwner(ctx.db, kind, slug)
  if (!owner) throw refuse.notFound(kind)
  const now = await databaseNow(ctx.db)
  const [retiredFrom, dates, offers, modes] = await Promise.all([
    ownRetirement(ctx.db, kind, owner.id),
    retirementDates(ctx.db, kind),
    offersOf(ctx.db, kind, owner.id, now),
    modeOwners(ctx.db, { kind, id: owner.id }),
  ])
  const first = dates.get(owner.id) ?? null
  return {
    kind,
    slug,
    name: owner.name,
    retiredFrom,
    goesWithCarrier: first === retiredFrom ? null : first,
    modeCount: modes.length,
    instruments: [...new Set(modes.map(({ instrument }) => instrument.name))],
    offers,
    today: now.toISOString().slice(0, 10),
  }
}
