import { changeRanking } from '@/db/queries/rankings'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openList, staleList } from './openList'
import { stepLine } from './order'
import type { LineInput } from './schema'

/** Draws the line one proposal higher or lower. */
export function moveLine(ctx: ActingContext, input: LineInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const { desk, ranking, order } = await openList(tx, input)
    const line = ranking.line_after ?? 0
    const next = stepLine(order, desk.hidden, line, input.direction)
    if (next === line)
      throw refuse.closed(
        input.direction === 'up'
          ? 'The line stands above all proposals.'
          : 'The line stands below all proposals.',
      )
    if (!(await changeRanking(tx.db, ranking, { line_after: next }))) throw staleList(desk, ranking)
    await writeLogbook(tx, {
      action: 'ranking.line',
      subject: { kind: 'ranking', id: ranking.id },
      actingAs: 'chair',
      before: { lineAfter: line },
      after: { lineAfter: next },
    })
  })
}
