import type { PanelAssignment } from '@/db/queries/assignments'
import { callCriteria } from '@/db/queries/calls'
import { panelFormula } from '@/db/queries/panelFormula'
import { readFormula } from '@/lib/panel/formula/readFormula'
import type { ActingContext } from '../context'
import type { ReadPanel } from '../panels/openPanel'
import { whyFormulaIsFixed } from '../panels/stages'
import type { Standing } from './certainty'
import { formulaValues } from './formulaValues'
import { commonQuantities, criterionNames } from './quantityNames'
import type { RankingView } from './rankingView'

export interface Measure {
  formula: RankingView['formula']
  values: ReadonlyMap<number, number | null>
  /** Place by the measure, the greatest first. */
  ranks: ReadonlyMap<number, number>
}

/** The panel's own measure of the proposals its reader sees, from their finished reviews. */
export async function readMeasure(
  ctx: ActingContext,
  desk: ReadPanel,
  assignments: readonly PanelAssignment[],
  standings: ReadonlyMap<number, Standing>,
): Promise<Measure> {
  const [criteria, stored] = await Promise.all([
    callCriteria(ctx.db, desk.call.id),
    panelFormula(ctx.db, desk.panel.id),
  ])
  const names = criterionNames(criteria)
  const quantities = [
    ...criteria.map(({ id, title }) => ({ name: names.get(id) ?? '', words: `mean of ${title}, 0 to 10` })),
    ...Object.entries(commonQuantities).map(([name, words]) => ({ name, words })),
  ]
  const read = stored
    ? readFormula(
        stored.text,
        quantities.map(({ name }) => name),
      )
    : null
  const values =
    read && !('why' in read)
      ? await formulaValues(ctx, desk.call.id, assignments, standings, read)
      : new Map<number, number | null>()
  const order = [...values]
    .flatMap(([id, value]) => (value === null ? [] : [{ id, value }]))
    .sort((a, b) => b.value - a.value)
  const isScored = (id: number) => standings.has(id)
  return {
    formula: {
      text: stored?.text ?? null,
      by: stored?.by ?? null,
      at: stored?.at?.toISOString() ?? null,
      fixed: whyFormulaIsFixed(desk.phase),
      quantities,
      without: desk.proposals
        .filter(({ id }) => isScored(id) && values.size > 0 && (values.get(id) ?? null) === null)
        .map(({ reviewNumber }) => reviewNumber),
    },
    values,
    ranks: new Map(order.map(({ id }, index) => [id, index + 1])),
  }
}
