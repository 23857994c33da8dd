import { replaceChoice, standingChoices } from '@/db/queries/nightTerms'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { visibleProposal } from '../panels/openPanel'
import { openDecisions } from './openDecisions'
import { planNights } from './planNights'
import type { ChoiceInput } from './schema'
import { whyNotChosen } from './whyNotChosen'

/** Lays down that a proposal must be given time, never, or only as a filler; or gives it back to its rank. */
export function chooseNights(ctx: ActingContext, input: ChoiceInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const { desk, ranking } = await openDecisions(tx, input.panelId)
    const proposal = visibleProposal(desk, input.proposalId)
    const before = (await standingChoices(tx.db, [proposal.id])).get(proposal.id) ?? null
    if ((before?.choice ?? 'rank') === input.choice)
      throw refuse.field('choice', `This stands for ${proposal.reviewNumber} already.`)
    const planned = await planNights(tx, desk, ranking, {
      trial: { choices: { [proposal.id]: input.choice } },
    })
    const numberOf = (id: number) => desk.proposals.find((one) => one.id === id)?.reviewNumber ?? ''
    const why = await whyNotChosen(tx, planned, proposal, input.choice, numberOf)
    if (why) throw refuse.field('choice', why)
    await replaceChoice(tx.db, {
      proposalId: proposal.id,
      choice: input.choice === 'rank' ? null : input.choice,
      reason: input.reason,
      by: tx.actor.personId,
    })
    await writeLogbook(tx, {
      action: 'decision.choose',
      subject: { kind: 'proposal', id: proposal.reviewNumber },
      actingAs: 'chair',
      before: before ?? undefined,
      after: { choice: input.choice, reason: input.reason },
    })
  })
}
