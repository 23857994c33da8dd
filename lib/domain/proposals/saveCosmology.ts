import { z } from 'zod'
import { fieldErrorsOf } from '@/lib/fieldErrorsOf'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { cosmologyFormOf, cosmologyFormSchema } from './cosmologyForm'
import { openForEditing } from './openProposal'
import { chosenCosmology } from './readContents'
import { reference, version } from './schema'
import { staleProposal } from './staleProposal'
import { writeProposal, type Saved } from './writeProposal'

const text = z.string().max(200)

/** The form as typed, with the proposal it belongs to; the form's own schema reads it in the verb. */
export const saveCosmologySchema = z.object({
  reference,
  version,
  form: z.object({
    choice: text,
    comparison: text,
    name: text,
    H0: text,
    Om0: text,
    omCounts: z.enum(['matter', 'all']).optional(),
    Ode0: text,
    w0: text,
    wa: text,
    Tcmb0: text,
    Neff: text,
    mNuEv: text,
  }),
})

export type SaveCosmologyInput = z.output<typeof saveCosmologySchema>

/** Keeps the cosmology every number of the proposal is computed under, and the one shown beside it. */
export async function saveCosmology(ctx: Context, input: SaveCosmologyInput): Promise<Saved> {
  const read = cosmologyFormSchema.safeParse(input.form)
  if (!read.success) throw refuse.invalid('This is not kept yet.', fieldErrorsOf(read.error))
  return inTransaction(ctx, async (tx) => {
    const opened = await openForEditing(tx, input.reference)
    const { row } = opened
    if (row.version !== input.version)
      throw await staleProposal(tx, row, { ...cosmologyFormOf(chosenCosmology(row)) })
    return writeProposal(tx, opened, 'proposal.cosmology', {
      cosmology_id: read.data.id,
      cosmology_parameters: JSON.stringify(read.data.parameters),
      comparison_cosmology_id: read.data.comparisonId,
    })
  })
}
