import { databaseNow } from '@/db/queries/clock'
import { modeOwners } from '@/db/queries/facilityOwners'
import { grantsOf } from '../actor'
import type { ActingContext } from '../context'
import { heldModes, type HeldMode } from './heldModes'

/** The modes of the instruments one is the scientist of, with their records in force today. */
export async function readOwnModes(ctx: ActingContext): Promise<HeldMode[]> {
  const instruments = grantsOf(ctx.actor, 'instrument-scientist').map(({ instrumentId }) => instrumentId)
  const ids = instruments.filter((id) => id !== null)
  const owners = await modeOwners(ctx.db, ids.length < instruments.length ? 'all' : { instrumentIds: ids })
  return heldModes(ctx.db, owners, (await databaseNow(ctx.db)).toISOString().slice(0, 10))
}
