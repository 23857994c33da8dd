import { requestLines } from '@/db/queries/panel'
import { callCriteria } from '@/db/queries/calls'
import type { PanelAssignment } from '@/db/queries/assignments'
import { standingScores } from '@/db/queries/reviews'
import type { Formula } from '@/lib/panel/formula/readFormula'
import type { ActingContext } from '../context'
import type { Standing } from './certainty'
import { criterionNames } from './quantityNames'

const mean = (values: readonly number[]) =>
  values.length === 0 ? null : values.reduce((sum, value) => sum + value, 0) / values.length

/** The value of a panel's formula for each proposal; null where a quantity is missing or nothing finite comes out. */
export async function formulaValues(
  ctx: Pick<ActingContext, 'db'>,
  callId: number,
  assignments: readonly PanelAssignment[],
  standings: ReadonlyMap<number, Standing>,
  formula: Formula,
): Promise<Map<number, number | null>> {
  const finished = assignments.filter((a) => a.finishedAt !== null)
  const ids = [...new Set(assignments.map((a) => a.proposalId))]
  const [criteria, sheets, lines] = await Promise.all([
    callCriteria(ctx.db, callId),
    standingScores(
      ctx.db,
      finished.map(({ id }) => id),
    ),
    requestLines(ctx.db, ids),
  ])
  const names = criterionNames(criteria)
  return new Map(
    ids.map((id) => {
      const own = finished.filter((a) => a.proposalId === id)
      const perCriterion = criteria.map(({ id: criterion }): [string, number | null] => [
        names.get(criterion) ?? '',
        mean(
          own.flatMap((a) => {
            const half = sheets.get(a.id)?.get(criterion) ?? null
            return half === null ? [] : [half / 2]
          }),
        ),
      ])
      const standing = standings.get(id)
      return [
        id,
        formula.valueOf({
          ...Object.fromEntries(perCriterion),
          mean: standing?.raw ?? null,
          merit: standing?.merit ?? null,
          spread: standing?.spread ?? null,
          reviews: standing?.reviews ?? 0,
          hours: lines.reduce(
            (sum, line) => sum + (line.proposalId === id ? line.askedSeconds / 3600 : 0),
            0,
          ),
        }),
      ]
    }),
  )
}
