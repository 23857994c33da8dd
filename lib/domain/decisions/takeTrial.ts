import { replaceChoice, replaceHeld } from '@/db/queries/nightTerms'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { visibleProposal, type PanelDesk } from '../panels/openPanel'
import { whyNotHeld } from './holdHours'
import type { PlannedNights } from './planNights'
import type { Trial } from './trialSchema'
import { whyNotChosen } from './whyNotChosen'

/**
 * Writes what a trial lays down, once the awards it is to stand with are free; the rest of it (nights, weather) is only a
 * way to plan. Refuses what could not be laid down by itself.
 */
export async function takeTrial(
  tx: ActingContext,
  desk: PanelDesk,
  planned: PlannedNights,
  { trial, reason }: { trial: Trial; reason: string },
): Promise<void> {
  const [choices, held] = [Object.entries(trial.choices ?? {}), Object.entries(trial.heldHours ?? {})]
  if (Object.values(trial.offeredPercent ?? {}).some((percent) => percent > 100))
    throw refuse.closed('This was tried with more nights than the call has. Only the office can add nights.')
  if (choices.length + held.length > 0 && reason.length < 10)
    throw refuse.field('reason', 'Say why, in a few words: it is kept in the logbook.')
  const numberOf = (id: number) => desk.proposals.find((one) => one.id === id)?.reviewNumber ?? ''
  for (const [telescope, hours] of held) {
    const [telescopeId, seconds] = [Number(telescope), Math.round(hours * 3600)]
    const why = await whyNotHeld(tx, desk, telescopeId, seconds)
    if (why) throw refuse.closed(why)
    await replaceHeld(tx.db, { callId: desk.call.id, telescopeId, seconds, reason, by: tx.actor.personId })
  }
  for (const [id, choice] of choices) {
    const proposal = visibleProposal(desk, Number(id))
    const why = await whyNotChosen(tx, planned, proposal, choice, numberOf)
    if (why) throw refuse.closed(why)
    const standing = choice === 'rank' ? null : choice
    await replaceChoice(tx.db, { proposalId: proposal.id, choice: standing, reason, by: tx.actor.personId })
  }
}
