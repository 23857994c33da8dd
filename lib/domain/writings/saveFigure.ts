import type { z } from 'zod'
import { changeFigure, figuresOf } from '@/db/queries/figures'
import { databaseNow } from '@/db/queries/clock'
import { touchProposal } from '@/db/queries/proposals'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'
import { staleProposal } from '../proposals/staleProposal'
import type { Saved } from '../proposals/writeProposal'
import type { saveFigureSchema } from './schema'

export type SaveFigureInput = z.output<typeof saveFigureSchema>

/** Keeps label and caption of a figure; refused when someone saved since `version` was read. */
export async function saveFigure(ctx: Context, input: SaveFigureInput): Promise<Saved> {
  return inTransaction(ctx, async (tx) => {
    const { row } = await openForEditing(tx, input.reference)
    const figures = await figuresOf(tx.db, row.id)
    const before = figures.find(({ id }) => id === input.id)
    if (!before) throw refuse.notFound('figure')
    const { label, caption } = input
    if (before.version !== input.version)
      throw await staleProposal(
        tx,
        { reference: row.reference, version: before.version, updated_at: row.updated_at },
        { label: before.label, caption: before.caption },
      )
    if (figures.some((other) => other.id !== before.id && other.label === label))
      throw refuse.field('label', 'Another figure has this label.')
    const savedAt = (await databaseNow(tx.db)).toISOString()
    if (before.label === label && before.caption === caption) return { version: before.version, savedAt }
    await changeFigure(tx.db, { id: before.id, version: before.version }, { label, caption })
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'figure.save',
      subject: { kind: 'proposal', id: row.reference },
      actingAs: 'investigator',
      before: { label: before.label, caption: before.caption },
      after: { label, caption },
    })
    return { version: before.version + 1, savedAt }
  })
}
