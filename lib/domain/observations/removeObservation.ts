import { z } from 'zod'
import { deleteObservation, findObservation } from '@/db/queries/observations'
import { touchProposal } from '@/db/queries/proposals'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'
import { observationRow } from './observationRow'
import type { ObservationRow } from './schema'

export const removeObservationSchema = z.object({
  reference: z.string().max(10),
  id: z.number().int().positive(),
})

export type RemoveObservationInput = z.output<typeof removeObservationSchema>

/** Takes an observation out; gives back its row as typed, so that adding it again undoes this. */
export async function removeObservation(
  ctx: Context,
  input: RemoveObservationInput,
): Promise<{ row: ObservationRow }> {
  return inTransaction(ctx, async (tx) => {
    const { row } = await openForEditing(tx, input.reference)
    const observation = await findObservation(tx.db, row.id, input.id)
    if (!observation) throw refuse.notFound('observation')
    await deleteObservation(tx.db, observation.id)
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'observation.remove',
      subject: { kind: 'proposal', id: input.reference },
      actingAs: 'investigator',
      before: { observation },
    })
    return { row: observationRow(observation) }
  })
}
