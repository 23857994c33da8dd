import {
  declarationsIn,
  lastReminders,
  pagesToRead,
  panelAssignments,
  type PanelAssignment,
} from '@/db/queries/assignments'
import { panelMembers } from '@/db/queries/panel'
import { recusalsOf } from '@/db/queries/recusals'
import { snapshotHeads } from '@/db/queries/snapshotHeads'
import { connectedGroups } from '@/lib/panel/statistics'
import { barredPairs } from '../conflicts/barredPairs'
import type { ActingContext } from '../context'
import { panelAffinity } from '../expertise/panelAffinity'
import { openPanel } from '../panels/openPanel'
import { interestInWords, whyNotReminded } from './rules'
import type { AssignmentsView } from './assignmentsView'

/** Two decimals are sent: more would say more than is known. */
const rounded = (value: number | null) => (value === null ? null : Math.round(value * 100) / 100)
const stateOf = (a: PanelAssignment) => (a.finishedAt ? 'finished' : a.begun ? 'begun' : 'to-read')

/** Who reads what on a panel, and how far they are; proposals kept from the reader of this page are in no row and no count. */
export async function readAssignments(
  ctx: ActingContext,
  key: { callSlug: string; panelId?: number },
): Promise<AssignmentsView> {
  const desk = await openPanel(ctx, key)
  const { call, panel } = desk
  const ids = desk.proposals.map(({ id }) => id)
  const numbers = new Map(desk.proposals.map(({ id, reviewNumber }) => [id, reviewNumber]))
  const [heads, pages, members, all, declared, reminded, left] = await Promise.all([
    snapshotHeads(ctx.db, ids),
    pagesToRead(ctx.db, ids),
    panelMembers(ctx.db, panel.id),
    panelAssignments(ctx.db, panel.id),
    declarationsIn(ctx.db, call.id),
    lastReminders(ctx.db, panel.id),
    recusalsOf(ctx.db, panel.id),
  ])
  const people = members.map(({ personId }) => personId)
  const [barred, affinity] = await Promise.all([
    barredPairs(ctx.db, call.id, people),
    panelAffinity(ctx.db, ids, people),
  ])
  const standing = all.filter((a) => numbers.has(a.proposalId))
  return {
    panelId: panel.id,
    panelName: panel.name,
    callId: call.id,
    callNumber: call.number,
    callSlug: call.slug,
    phase: desk.phase,
    quorum: panel.quorum,
    reviewsDueAt: call.reviewsDueAt.toISOString(),
    rows: desk.proposals.map((proposal) => ({
      proposalId: proposal.id,
      reviewNumber: proposal.reviewNumber,
      title: heads.get(proposal.id)?.title ?? '',
      kind: proposal.kind,
      pages: pages.get(proposal.id) ?? 0,
      readers: standing
        .filter((a) => a.proposalId === proposal.id)
        .map((a) => ({ assignmentId: a.id, personId: a.personId, seat: a.seat, state: stateOf(a) })),
      interests: [
        ...new Map(
          barred
            .filter((pair) => pair.proposalId === proposal.id)
            .map((pair) => [pair.personId, { personId: pair.personId, words: interestInWords(pair) }]),
        ).values(),
      ],
      affinities: people.map((personId) => rounded(affinity.of(proposal.id, personId))),
    })),
    reviewers: members.map((member) => {
      const own = standing.filter((a) => a.personId === member.personId)
      const open = own.filter((a) => !a.finishedAt)
      const last = reminded.get(member.personId) ?? null
      return {
        personId: member.personId,
        number: member.number,
        name: member.name,
        mayReview: member.mayReview,
        hasDeclared: declared.has(member.personId),
        hasStated: affinity.stated.has(member.personId),
        proposals: own.length,
        pages: own.reduce((sum, a) => sum + (pages.get(a.proposalId) ?? 0), 0),
        finished: own.length - open.length,
        owed: open.map((a) => numbers.get(a.proposalId) ?? ''),
        remindedAt: last?.toISOString() ?? null,
        whyNotReminded: whyNotReminded(open.length, last, desk.now),
      }
    }),
    recusals: left.flatMap(({ proposalId, name, reason, at }) => {
      const reviewNumber = numbers.get(proposalId)
      return reviewNumber === undefined ? [] : [{ reviewNumber, name, reason, at: at.toISOString() }]
    }),
    groups: connectedGroups(standing.map((a) => ({ proposal: a.proposalId, reviewer: a.personId }))).length,
  }
}
