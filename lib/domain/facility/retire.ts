import type { z } from 'zod'
import { databaseNow } from '@/db/queries/clock'
import { lockOpenCalls, offersOf, setRetirement } from '@/db/queries/retirements'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { mayEditFacility } from './policy'
import { retireeIn } from './retireeIn'
import { retireProblem } from './retireProblem'
import type { retireSchema } from './retireSchema'

/**
 * Takes a site, telescope, instrument or mode out of service from an evening on, with all it carries: calls whose
 * season reaches that evening no longer offer it. Refused while a call that has not closed does.
 */
export async function retire(
  ctx: ActingContext,
  input: z.output<typeof retireSchema>,
): Promise<{ retiredFrom: string }> {
  authorize(mayEditFacility(ctx.actor))
  const { kind, slug, before, retiredFrom } = input
  return inTransaction(ctx, async (tx) => {
    const now = await databaseNow(tx.db)
    await lockOpenCalls(tx.db, now)
    const owner = await retireeIn(tx.db, input, now)
    const offers = await offersOf(tx.db, kind, owner.id, now)
    const problem = retireProblem(retiredFrom, now.toISOString().slice(0, 10), offers)
    if (problem) throw refuse.field('retiredFrom', problem)
    await setRetirement(tx.db, kind, owner.id, retiredFrom)
    await writeLogbook(tx, {
      action: 'facility.retire',
      subject: { kind, id: slug },
      actingAs: 'office',
      before: { of: owner.name, retiredFrom: before },
      after: { of: owner.name, retiredFrom },
    })
    return { retiredFrom }
  })
}
