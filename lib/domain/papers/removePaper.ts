import type { z } from 'zod'
import { papersOf, supersedePapers } from '@/db/queries/papers'
import { touchProposal } from '@/db/queries/proposals'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'
import type { removePaperSchema } from './schema'

/** Takes a document off. The bytes stay: a version sent before may hold them. */
export async function removePaper(ctx: Context, input: z.output<typeof removePaperSchema>): Promise<void> {
  await inTransaction(ctx, async (tx) => {
    const { row } = await openForEditing(tx, input.reference)
    const standing = (await papersOf(tx.db, row.id)).find(({ kind }) => kind === input.kind)
    if (!standing) return
    await supersedePapers(tx.db, row.id, input.kind)
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'papers.remove',
      subject: { kind: 'proposal', id: row.reference },
      actingAs: 'investigator',
      before: { kind: standing.kind, fileName: standing.fileName },
    })
  })
}
