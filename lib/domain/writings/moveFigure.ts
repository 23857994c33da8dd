import type { z } from 'zod'
import { figuresOf, orderFigures } from '@/db/queries/figures'
import { touchProposal } from '@/db/queries/proposals'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'
import type { moveFigureSchema } from './schema'

/** Moves a figure one place up or down; nothing where it would pass the end. */
export async function moveFigure(ctx: Context, input: z.output<typeof moveFigureSchema>): Promise<void> {
  await inTransaction(ctx, async (tx) => {
    const { row } = await openForEditing(tx, input.reference)
    const order = await figuresOf(tx.db, row.id)
    const from = order.findIndex(({ id }) => id === input.id)
    const figure = order[from]
    const other = order[from + input.by]
    if (!figure || !other) return
    order[from] = other
    order[from + input.by] = figure
    await orderFigures(
      tx.db,
      order.map(({ id }) => id),
    )
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'figure.order',
      subject: { kind: 'proposal', id: row.reference },
      actingAs: 'investigator',
      after: { labels: order.map(({ label }) => label) },
    })
  })
}
