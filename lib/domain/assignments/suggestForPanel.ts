import { pagesToRead, panelAssignments } from '@/db/queries/assignments'
import { panelMembers } from '@/db/queries/panel'
import { optimalAssignments } from '@/lib/panel/assignment/optimalAssignments'
import { suggestAssignments } from '@/lib/panel/assignment/suggestAssignments'
import type { Solve } from '@/lib/panel/solver/types'
import { solveInWorker } from '@/lib/services/solver/solveInWorker'
import { barredPairs } from '../conflicts/barredPairs'
import type { ActingContext } from '../context'
import { LITTLE } from '../expertise/affinityWords'
import { panelAffinity } from '../expertise/panelAffinity'
import { openPanel } from '../panels/openPanel'
import type { SuggestInput } from './schema'
import { servedWorst } from './servedWorst'
import type { SuggestedPairs } from './suggestionWords'

/** A chair waits this long for the best answer; then the best so far is shown with its gap. */
const SOLVER_SECONDS = 20

/**
 * A suggestion for what is still missing; nothing is written. The chair reads only when put there by hand. Without a
 * solver, or without an answer of it, proposals are dealt out one after the other, and the suggestion says so.
 */
export async function suggestForPanel(
  ctx: ActingContext,
  input: SuggestInput,
  solve: Solve | null = solveInWorker,
): Promise<SuggestedPairs> {
  const desk = await openPanel(ctx, { panelId: input.panelId, lock: true })
  const ids = desk.proposals.map(({ id }) => id)
  const members = await panelMembers(ctx.db, desk.panel.id)
  const reviewers = members.filter((m) => m.mayReview && m.seat !== 'chair').map((m) => m.personId)
  const [pages, barred, all, known] = await Promise.all([
    pagesToRead(ctx.db, ids),
    barredPairs(ctx.db, desk.call.id, reviewers),
    panelAssignments(ctx.db, desk.panel.id),
    panelAffinity(ctx.db, ids, reviewers),
  ])
  const standing = all
    .filter((a) => ids.includes(a.proposalId))
    .map((a) => ({ proposal: a.proposalId, reviewer: a.personId, seat: a.seat }))
  const wanted = {
    proposals: ids.map((id) => ({
      id,
      pages: pages.get(id) ?? 0,
      barred: new Set(barred.filter((pair) => pair.proposalId === id).map((pair) => pair.personId)),
    })),
    reviewers,
    standing,
    each: input.each,
  }
  // Where nobody has said what they know, every reader serves a proposal alike, and the loads decide.
  const hasSaid = known.stated.size > 0
  const affinity = (proposal: number, reviewer: number) => (hasSaid ? (known.of(proposal, reviewer) ?? 0) : 1)
  const best = solve
    ? await optimalAssignments({ ...wanted, affinity, seconds: SOLVER_SECONDS }, solve)
    : { why: 'No solver was asked.' }
  const { pairs, short } = 'why' in best ? suggestAssignments(wanted) : best
  const numbers = new Map(desk.proposals.map(({ id, reviewNumber }) => [id, reviewNumber]))
  const names = new Map(members.map(({ personId, name }) => [personId, name]))
  const made = [...standing, ...pairs]
  const loads = reviewers.map((id) =>
    made.reduce((sum, pair) => sum + (pair.reviewer === id ? (pages.get(pair.proposal) ?? 0) : 0), 0),
  )
  const full = ids.filter((id) => !short.some(({ proposal }) => proposal === id))
  const isStrange = ({ id, barred: may }: (typeof wanted.proposals)[number]) =>
    reviewers.every((reviewer) => may.has(reviewer) || affinity(id, reviewer) < LITTLE)
  return {
    pairs: pairs.map(({ proposal, reviewer, seat }) => ({ proposalId: proposal, personId: reviewer, seat })),
    short: short.map(({ proposal, lacking }) => ({ reviewNumber: numbers.get(proposal) ?? '', lacking })),
    loads: loads.length > 0 ? { leastPages: Math.min(...loads), mostPages: Math.max(...loads) } : null,
    known: hasSaid
      ? {
          silent: reviewers.filter((id) => !known.stated.has(id)).length,
          strange: wanted.proposals.filter(isStrange).map(({ id }) => numbers.get(id) ?? ''),
        }
      : null,
    best:
      'why' in best
        ? { why: best.why }
        : {
            meanPages: best.meanPages,
            tolerancePages: best.tolerancePages,
            outside: best.outside.map(({ reviewer, pages: own }) => ({
              name: names.get(reviewer) ?? '',
              pages: own,
            })),
            worst: best.worst,
            sum: best.sum,
            worstNumber: numbers.get(servedWorst(full, made, affinity) ?? 0) ?? '',
            readers: input.each,
            whyNotLinked: best.whyNotLinked,
          },
  }
}
