import { panelAssignments } from '@/db/queries/assignments'
import { namesOf, openedAsTheyStand } from '@/db/queries/approvals'
import { judgesOf } from '@/db/queries/conflicts'
import { standingAwards, standingDecisions } from '@/db/queries/decisions'
import { panelMembers, type PanelProposal } from '@/db/queries/panel'
import { panelTexts } from '@/db/queries/panelTexts'
import { rankingEntries } from '@/db/queries/rankings'
import { snapshotHeads } from '@/db/queries/snapshotHeads'
import type { RankingsRow } from '@/db/tables'
import { rawScores } from '@/lib/panel/statistics'
import type { ActingContext } from '../context'
import { panelScores } from '../rankings/panelScores'
import { visibleLine, visibleOrder } from '../rankings/order'
import { textFlags } from '../reviews/textFlags'
import { approvableOf } from './approvableOf'
import { approvalState, whyNotApproved } from './approval'
import type { DecisionRow } from './decisionsView'
import { outcomeOf } from './rules'

export interface DecidedPanel {
  callId: number
  panelId: number
  /** As the reader may see them, and what is kept from them. */
  proposals: readonly PanelProposal[]
  hidden: ReadonlySet<number>
  ranking: RankingsRow | null
}

/** Whoever reads for the panel, as a text might name them. */
async function knownReaders(ctx: ActingContext, panelId: number) {
  const members = await panelMembers(ctx.db, panelId)
  const judges = await judgesOf(
    ctx.db,
    members.map(({ personId }) => personId),
  )
  return {
    numberOf: new Map(members.map(({ personId, number }) => [personId, number])),
    names: {
      people: members.map(({ name }) => name),
      institutes: [...new Set(judges.flatMap(({ institutes }) => institutes))],
    },
  }
}

/** The panel's decisions in the order of its ranking, each with what deserves a second look and who has approved it. */
export async function decisionRows(ctx: ActingContext, panel: DecidedPanel): Promise<DecisionRow[]> {
  const { ranking, hidden, proposals } = panel
  const entries = ranking ? await rankingEntries(ctx.db, ranking.id) : []
  const full = entries.map((entry) => entry.proposal_id)
  const numbers = new Map(proposals.map(({ id, reviewNumber }) => [id, reviewNumber]))
  const order = visibleOrder(full, hidden).filter((id) => numbers.has(id))
  const line = visibleLine(full, hidden, ranking?.line_after ?? 0)
  const assignments = (await panelAssignments(ctx.db, panel.panelId)).filter((a) => numbers.has(a.proposalId))
  const [heads, decisions, awards, texts, readers, scores] = await Promise.all([
    snapshotHeads(ctx.db, order),
    standingDecisions(ctx.db, order),
    standingAwards(ctx.db, order),
    panelTexts(ctx.db, order),
    knownReaders(ctx, panel.panelId),
    panelScores(ctx, panel.callId, assignments),
  ])
  const means = new Map(rawScores(scores).map((one) => [one.proposal, one.mean]))
  const opened = await openedAsTheyStand(
    ctx.db,
    [...decisions.values()].map((decision) => decision.id),
    ctx.actor.personId,
  )
  const approvers = await namesOf(
    ctx.db,
    [...decisions.values()].flatMap((decision) => decision.approved_by ?? []),
  )
  return order.map((id, index): DecisionRow => {
    const decision = decisions.get(id)
    const lines = awards.filter((award) => award.proposalId === id)
    const approvable = decision && approvableOf(decision)
    const statement = decision?.statement ?? ''
    return {
      proposalId: id,
      reviewNumber: numbers.get(id) ?? '',
      title: heads.get(id)?.title ?? '',
      rank: index + 1,
      isAbove: index < line,
      outcome: decision?.released_at ? decision.outcome : outcomeOf(lines),
      lines,
      askedSeconds: heads.get(id)?.askedSeconds ?? 0,
      statement,
      version: decision?.version ?? 0,
      isPrepared: statement.trim() !== '',
      releasedAt: decision?.released_at?.toISOString() ?? null,
      flags: textFlags(statement, { score: means.get(id) ?? null, readers: readers.names }),
      comments: texts
        .filter((text) => text.proposalId === id && text.audience === 'investigators')
        .map(({ assignmentId, personId, body, withheldReason }) => ({
          assignmentId,
          reviewer: readers.numberOf.get(personId) ?? 0,
          body,
          withheldReason,
          flags: textFlags(body, {
            score: scores.find((one) => one.proposal === id && one.reviewer === personId)?.score ?? null,
            readers: readers.names,
          }),
        })),
      approval: approvable ? approvalState(approvable) : 'waits',
      approvedBy: decision?.approved_by ? (approvers.get(decision.approved_by) ?? null) : null,
      whyNotApproved: approvable
        ? whyNotApproved(approvable, ctx.actor.personId)
        : 'It is not prepared yet: it needs a statement.',
      isOpened: decision !== undefined && opened.has(decision.id),
    }
  })
}
