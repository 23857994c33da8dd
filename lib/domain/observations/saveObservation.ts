import { z } from 'zod'
import { findObservation, updateObservation } from '@/db/queries/observations'
import { touchProposal } from '@/db/queries/proposals'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'
import { staleProposal } from '../proposals/staleProposal'
import type { Observation } from '../proposals/types'
import { observationRow } from './observationRow'
import { placeObservation } from './placeObservation'
import { observationRowSchema } from './schema'

export const saveObservationSchema = z.object({
  reference: z.string().max(10),
  id: z.number().int().positive(),
  version: z.number().int().positive(),
  row: observationRowSchema,
})

export type SaveObservationInput = z.output<typeof saveObservationSchema>

/** Saves one observation. Who comes second is shown what the first one wrote; nothing is overwritten. */
export async function saveObservation(ctx: Context, input: SaveObservationInput): Promise<Observation> {
  return inTransaction(ctx, async (tx) => {
    const opened = await openForEditing(tx, input.reference)
    const before = await findObservation(tx.db, opened.row.id, input.id)
    if (!before) throw refuse.notFound('observation')
    if (before.version !== input.version)
      throw await staleProposal(
        tx,
        { reference: input.reference, version: before.version, updated_at: opened.row.updated_at },
        observationRow(before),
      )
    const values = await placeObservation(tx, opened, input.row)
    await updateObservation(tx.db, before, { ...values, position: before.position })
    const observation = await findObservation(tx.db, opened.row.id, input.id)
    if (!observation) throw refuse.integrity('The observation could not be read back.')
    await touchProposal(tx.db, opened.row.id)
    await writeLogbook(tx, {
      action: 'observation.save',
      subject: { kind: 'proposal', id: input.reference },
      actingAs: 'investigator',
      before: { observation: before },
      after: { observation },
    })
    return observation
  })
}
