import type { z } from 'zod'
import { figuresOf, takeFigureOff } from '@/db/queries/figures'
import { touchProposal } from '@/db/queries/proposals'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'
import type { figureSchema } from './schema'

/** Takes a figure off. The picture stays: a version sent before may hold it. */
export async function removeFigure(ctx: Context, input: z.output<typeof figureSchema>): Promise<void> {
  await inTransaction(ctx, async (tx) => {
    const { row } = await openForEditing(tx, input.reference)
    const standing = (await figuresOf(tx.db, row.id)).find(({ id }) => id === input.id)
    if (!standing) return
    await takeFigureOff(tx.db, standing.id)
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'figure.remove',
      subject: { kind: 'proposal', id: row.reference },
      actingAs: 'investigator',
      before: { label: standing.label, sha256: standing.sha256 },
    })
  })
}
