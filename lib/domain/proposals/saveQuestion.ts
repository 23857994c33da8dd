import type { z } from 'zod'
import { refuse } from '@/lib/errors'
import { fieldErrorsOf } from '@/lib/fieldErrorsOf'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { openForEditing } from './openProposal'
import { questionSchema, type saveQuestionSchema } from './schema'
import { staleProposal } from './staleProposal'
import { writeProposal, type Saved } from './writeProposal'

export type SaveQuestionInput = z.output<typeof saveQuestionSchema>

/** Keeps title, abstract and category; refused when someone saved since `version` was read. */
export async function saveQuestion(ctx: Context, input: SaveQuestionInput): Promise<Saved> {
  return inTransaction(ctx, async (tx) => {
    const opened = await openForEditing(tx, input.reference)
    const { row, subject } = opened
    const checked = questionSchema(subject.kind.abstractLimit).safeParse(input)
    if (!checked.success) throw refuse.invalid('Something here needs mending.', fieldErrorsOf(checked.error))
    const { title, abstract, category } = checked.data
    if (row.version !== input.version)
      throw await staleProposal(tx, row, { title: row.title, abstract: row.abstract, category: row.category })
    return writeProposal(tx, opened, 'proposal.question', { title, abstract, category })
  })
}
