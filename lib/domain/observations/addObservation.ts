import { z } from 'zod'
import { findObservation, insertObservation, observationsOf } from '@/db/queries/observations'
import { touchProposal } from '@/db/queries/proposals'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'
import type { Observation } from '../proposals/types'
import { placeObservation } from './placeObservation'
import { observationRowSchema } from './schema'

export const addObservationSchema = z.object({ reference: z.string().max(10), row: observationRowSchema })

export type AddObservationInput = z.output<typeof addObservationSchema>

const mostObservations = 1000

/** Asks for a target with an instrument mode, to a depth. */
export async function addObservation(ctx: Context, input: AddObservationInput): Promise<Observation> {
  return inTransaction(ctx, async (tx) => {
    const opened = await openForEditing(tx, input.reference)
    const present = await observationsOf(tx.db, opened.row.id)
    if (present.length >= mostObservations)
      throw refuse.invalid(`A proposal holds at most ${mostObservations} observations.`)
    const values = await placeObservation(tx, opened, input.row)
    const position = present.reduce((last, one) => Math.max(last, one.position), 0) + 1
    const id = await insertObservation(tx.db, opened.row.id, { ...values, position })
    const observation = await findObservation(tx.db, opened.row.id, id)
    if (!observation) throw refuse.integrity('The observation could not be read back.')
    await touchProposal(tx.db, opened.row.id)
    await writeLogbook(tx, {
      action: 'observation.add',
      subject: { kind: 'proposal', id: input.reference },
      actingAs: 'investigator',
      after: { observation },
    })
    return observation
  })
}
