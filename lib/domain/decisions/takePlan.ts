import {
  standingAwards,
  standingDecisions,
  supersedeAwards,
  type StandingAward,
} from '@/db/queries/decisions'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { eveningsText } from '../visits/readEvenings'
import { giveLines } from './giveLines'
import type { GivenLine } from './givenLine'
import { openDecisions } from './openDecisions'
import { planNights, type PlannedNights } from './planNights'
import { policyNames } from './policyWords'
import type { PlanInput } from './schema'
import { takeTrial } from './takeTrial'

/** What a plan gives a proposal; conditions stay as they were. */
function plannedLines(
  { plan, terms, visits }: PlannedNights,
  kept: readonly StandingAward[],
  proposalId: number,
): GivenLine[] {
  const isFiller = terms.choices.get(proposalId)?.choice === 'filler'
  return plan.given
    .filter((line) => line.proposal === proposalId)
    .map(({ instrument, seconds }) => {
      const old = kept.find((line) => line.proposalId === proposalId && line.instrumentId === instrument)
      const visit = visits.dated.find((one) => one.proposal === proposalId && one.instrument === instrument)
      return {
        instrumentId: instrument,
        seconds,
        isReserve: false,
        service: visit ? ('visitor' as const) : ('queue' as const),
        evenings: visit?.halves ?? [],
        conditions: old?.conditions || (isFiller ? 'bright time' : ''),
      }
    })
}

/**
 * Takes the suggestion over as the awards of every proposal of the list, with what was tried where something was; what
 * was given by hand before is superseded.
 */
export function takePlan(ctx: ActingContext, input: PlanInput): Promise<{ awarded: number }> {
  return inTransaction(ctx, async (tx) => {
    const { desk, ranking } = await openDecisions(tx, input.panelId)
    const { trial, reason = '' } = input
    const planned = await planNights(tx, desk, ranking, { policy: input.policy, trial })
    const { order, wanted, plan, policy } = planned
    const before = await standingDecisions(tx.db, order)
    const kept = await standingAwards(tx.db, order)
    // First free everything, so that one proposal's old award does not stand in another's way.
    for (const decision of before.values()) await supersedeAwards(tx.db, decision.id)
    if (trial) await takeTrial(tx, desk, planned, { trial, reason })
    for (const proposalId of order)
      await giveLines(tx, desk, wanted, {
        proposalId,
        version: before.get(proposalId)?.version ?? 0,
        lines: plannedLines(planned, kept, proposalId),
      })
    await writeLogbook(tx, {
      action: 'decision.take-plan',
      subject: { kind: 'panel', id: desk.panel.id },
      actingAs: 'chair',
      after: {
        policy: policyNames[policy],
        ...(trial ? { trial, reason } : {}),
        given: plan.given.map(({ laid: _laid, parts: _parts, ...line }) => line),
        visits: planned.visits.dated.map(({ proposal, instrument, halves }) => ({
          ...{ proposal, instrument, evenings: eveningsText(halves) },
        })),
      },
    })
    return { awarded: new Set(plan.given.map((line) => line.proposal)).size }
  })
}
