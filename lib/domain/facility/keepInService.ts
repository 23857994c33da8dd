import type { z } from 'zod'
import { databaseNow } from '@/db/queries/clock'
import { deleteRetirement } from '@/db/queries/retirements'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { mayEditFacility } from './policy'
import { retireeIn } from './retireeIn'
import type { keepSchema } from './retireSchema'

/** Takes a retirement back: calls may offer it again. */
export async function keepInService(ctx: ActingContext, input: z.output<typeof keepSchema>): Promise<void> {
  authorize(mayEditFacility(ctx.actor))
  const { kind, slug, before } = input
  await inTransaction(ctx, async (tx) => {
    const owner = await retireeIn(tx.db, input, await databaseNow(tx.db))
    if (before === null) throw refuse.invalid(`${owner.name} does not retire.`)
    await deleteRetirement(tx.db, kind, owner.id)
    await writeLogbook(tx, {
      action: 'facility.keep',
      subject: { kind, id: slug },
      actingAs: 'office',
      before: { of: owner.name, retiredFrom: before },
      after: { of: owner.name, retiredFrom: null },
    })
  })
}
