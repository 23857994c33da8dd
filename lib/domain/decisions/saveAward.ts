import { standingAwards } from '@/db/queries/decisions'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { visibleProposal } from '../panels/openPanel'
import { giveLines } from './giveLines'
import { openDecisions } from './openDecisions'
import type { AwardInput } from './schema'
import { wantedLines } from './wantedLines'

/** Gives a proposal its hours, whole or in part, on one line an instrument; older lines are superseded. */
export function saveAward(ctx: ActingContext, input: AwardInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const { desk } = await openDecisions(tx, input.panelId)
    const proposal = visibleProposal(desk, input.proposalId)
    const before = await standingAwards(tx.db, [proposal.id])
    const lines = input.lines.map(({ hours, ...line }) => ({ ...line, seconds: hours }))
    await giveLines(tx, desk, await wantedLines(tx.db, [proposal.id]), {
      proposalId: proposal.id,
      version: input.version,
      lines,
    })
    await writeLogbook(tx, {
      action: 'decision.award',
      subject: { kind: 'proposal', id: proposal.reviewNumber },
      actingAs: 'chair',
      before: before.map(({ instrumentId, seconds, isReserve, service }) => ({
        ...{ instrumentId, seconds, isReserve, service },
      })),
      after: lines,
    })
  })
}
