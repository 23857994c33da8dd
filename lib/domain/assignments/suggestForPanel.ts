import { pagesToRead, panelAssignments } from '@/db/queries/assignments'
import { panelMembers } from '@/db/queries/panel'
import { suggestAssignments } from '@/lib/panel/assignment/suggestAssignments'
import { barredPairs } from '../conflicts/barredPairs'
import type { ActingContext } from '../context'
import { openPanel } from '../panels/openPanel'
import type { Seat, SuggestInput } from './schema'

export interface SuggestedPairs {
  pairs: { proposalId: number; personId: number; seat: Seat }[]
  short: { reviewNumber: string; lacking: number }[]
}

/** A suggestion for what is still missing; nothing is written. The chair reads only when put there by hand. */
export async function suggestForPanel(ctx: ActingContext, input: SuggestInput): Promise<SuggestedPairs> {
  const desk = await openPanel(ctx, { panelId: input.panelId, lock: true })
  const ids = desk.proposals.map(({ id }) => id)
  const members = await panelMembers(ctx.db, desk.panel.id)
  const reviewers = members.filter((m) => m.mayReview && m.seat !== 'chair').map((m) => m.personId)
  const [pages, barred, standing] = await Promise.all([
    pagesToRead(ctx.db, ids),
    barredPairs(ctx.db, desk.call.id, reviewers),
    panelAssignments(ctx.db, desk.panel.id),
  ])
  const { pairs, short } = suggestAssignments({
    proposals: ids.map((id) => ({
      id,
      pages: pages.get(id) ?? 0,
      barred: new Set(barred.filter((pair) => pair.proposalId === id).map((pair) => pair.personId)),
    })),
    reviewers,
    standing: standing
      .filter((a) => ids.includes(a.proposalId))
      .map((a) => ({ proposal: a.proposalId, reviewer: a.personId, seat: a.seat })),
    each: input.each,
  })
  const numbers = new Map(desk.proposals.map(({ id, reviewNumber }) => [id, reviewNumber]))
  return {
    pairs: pairs.map(({ proposal, reviewer, seat }) => ({ proposalId: proposal, personId: reviewer, seat })),
    short: short.map(({ proposal, lacking }) => ({ reviewNumber: numbers.get(proposal) ?? '', lacking })),
  }
}
