import { panelAssignments } from '@/db/queries/assignments'
import type { AssignmentFacts } from '@/db/queries/assignmentsRead'
import { standingScores } from '@/db/queries/reviews'
import { scaleUse } from '@/lib/panel/statistics'
import type { CallPhase } from '../calls/types'
import type { ActingContext } from '../context'
import { whyScaleAlone } from './scalePolicy'
import type { ScaleUse } from './types'

/**
 * How the reader of this page has used the scale on their own assignments, and the other finished reviews of the same
 * panels together where that may be shown: never of what the reader has an interest in.
 */
export async function readScaleUse(
  ctx: ActingContext,
  phase: CallPhase,
  own: readonly AssignmentFacts[],
  barred: ReadonlySet<number>,
): Promise<ScaleUse> {
  const me = ctx.actor.personId
  const counted = async (ids: readonly number[]) =>
    scaleUse(
      [...(await standingScores(ctx.db, ids)).values()].flatMap((sheet) =>
        [...sheet.values()].filter((half) => half !== null),
      ),
    )
  const mine = await counted(own.map(({ id }) => id))
  const early = whyScaleAlone(phase, null)
  if (early) return { own: mine, others: null, whyAlone: early }
  const panels = [...new Set(own.map(({ panelId }) => panelId))]
  const all = (await Promise.all(panels.map((id) => panelAssignments(ctx.db, id)))).flat()
  const theirs = all.filter((one) => one.personId !== me && one.finishedAt && !barred.has(one.proposalId))
  const why = whyScaleAlone(phase, new Set(theirs.map(({ personId }) => personId)).size)
  return {
    own: mine,
    others: why ? null : await counted(theirs.map(({ id }) => id)),
    whyAlone: why ?? '',
  }
}
