import { callCriteria } from '@/db/queries/calls'
import { panelFormula, writePanelFormula } from '@/db/queries/panelFormula'
import { refuse } from '@/lib/errors'
import { readFormula } from '@/lib/panel/formula/readFormula'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openPanel } from '../panels/openPanel'
import { whyFormulaIsFixed } from '../panels/stages'
import { commonQuantities, criterionNames } from './quantityNames'
import type { FormulaInput } from './schema'

/** Writes the panel's own measure, or takes it away; possible until the review opens, so that no score is seen before. */
export function saveFormula(ctx: ActingContext, input: FormulaInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const desk = await openPanel(tx, { panelId: input.panelId, lock: true })
    const why = whyFormulaIsFixed(desk.phase)
    if (why) throw refuse.closed(why)
    const names = criterionNames(await callCriteria(tx.db, desk.call.id))
    if (input.formula !== '') {
      const read = readFormula(input.formula, [...names.values(), ...Object.keys(commonQuantities)])
      if ('why' in read) throw refuse.field('formula', read.why)
      if (read.names.length === 0)
        throw refuse.field('formula', 'It is the same for every proposal: use at least one quantity.')
    }
    const before = await panelFormula(tx.db, desk.panel.id)
    await writePanelFormula(tx.db, desk.panel.id, { text: input.formula || null, by: tx.actor.personId })
    await writeLogbook(tx, {
      action: 'panel.formula',
      subject: { kind: 'panel', id: desk.panel.id },
      actingAs: 'chair',
      before: { formula: before?.text ?? null },
      after: { formula: input.formula || null },
    })
  })
}
