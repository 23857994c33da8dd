import type { z } from 'zod'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { openForEditing } from './openProposal'
import { sections, type sectionDoneSchema } from './schema'
import { writeProposal, type Saved } from './writeProposal'

export type MarkSectionDoneInput = z.output<typeof sectionDoneSchema>

/** The author says that a section is done, or takes it back. No version is asked: a tick overwrites no text. */
export async function markSectionDone(ctx: Context, input: MarkSectionDoneInput): Promise<Saved> {
  return inTransaction(ctx, async (tx) => {
    const opened = await openForEditing(tx, input.reference)
    const marked = new Set(JSON.parse(opened.row.sections_done) as string[])
    if (input.done) marked.add(input.section)
    else marked.delete(input.section)
    const kept = sections.filter((section) => marked.has(section))
    return writeProposal(tx, opened, 'proposal.section', { sections_done: JSON.stringify(kept) })
  })
}
