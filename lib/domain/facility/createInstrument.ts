import type { z } from 'zod'
import { databaseNow } from '@/db/queries/clock'
import { insertInstrument } from '@/db/queries/newRecords'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { carrierIn } from './carrierIn'
import type { newInstrumentSchema } from './instrumentSchema'
import { mayEditFacility } from './policy'
import { putIn } from './putIn'

/** A new instrument of a telescope. It has no record of its own: its modes have. */
export async function createInstrument(
  ctx: ActingContext,
  input: z.output<typeof newInstrumentSchema>,
): Promise<{ slug: string }> {
  authorize(mayEditFacility(ctx.actor))
  const { slug, name, summary } = input
  return inTransaction(ctx, async (tx) => {
    const telescope = await carrierIn(tx.db, 'telescope', input.of, await databaseNow(tx.db))
    await putIn(tx.db, { kind: 'instrument', slug, name, carrierId: telescope.id }, () =>
      insertInstrument(tx.db, telescope.id, input),
    )
    await writeLogbook(tx, {
      action: 'facility.instrument',
      subject: { kind: 'instrument', id: slug },
      actingAs: 'office',
      after: { of: name, on: telescope.name, summary },
    })
    return { slug }
  })
}
