import { replaceLeast, standingLeasts } from '@/db/queries/nightTerms'
import { refuse } from '@/lib/errors'
import { formatHoursFromSeconds } from '@/lib/format'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { visibleProposal } from '../panels/openPanel'
import { openDecisions } from './openDecisions'
import type { LeastInput } from './schema'
import { wantedLines } from './wantedLines'

/** Sets the least useful award of a proposal on an instrument in the place of its own, or takes that back (no hours). */
export function setLeast(ctx: ActingContext, input: LeastInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const { desk } = await openDecisions(tx, input.panelId)
    const proposal = visibleProposal(desk, input.proposalId)
    const { instrumentId, hours: seconds, reason } = input
    const line = (await wantedLines(tx.db, [proposal.id])).find((one) => one.instrumentId === instrumentId)
    if (!line) throw refuse.notFound('instrument')
    if (seconds > line.wholeSeconds)
      throw refuse.field(
        'hours',
        `${proposal.reviewNumber} takes ${formatHoursFromSeconds(line.wholeSeconds)} of ${line.instrument}: the least cannot be more.`,
      )
    const standing = (await standingLeasts(tx.db, [proposal.id])).find(
      (one) => one.instrumentId === instrumentId,
    )
    if (seconds === 0 && !standing)
      throw refuse.field('hours', 'Nothing was set by the panel. Type the hours that are least of use.')
    await replaceLeast(tx.db, {
      ...{ proposalId: proposal.id, instrumentId, seconds, reason },
      by: tx.actor.personId,
    })
    await writeLogbook(tx, {
      action: 'decision.least',
      subject: { kind: 'proposal', id: proposal.reviewNumber },
      actingAs: 'chair',
      before: standing ? { instrumentId, seconds: standing.seconds, reason: standing.reason } : undefined,
      after: { instrumentId, seconds, reason },
    })
  })
}
