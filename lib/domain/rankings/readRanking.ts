import { panelAssignments } from '@/db/queries/assignments'
import { offeredTime, panelMembers, requestLines } from '@/db/queries/panel'
import {
  currentRanking,
  hasFrozenRanking,
  lastFrozenBefore,
  movesByHand,
  rankingEntries,
} from '@/db/queries/rankings'
import { snapshotHeads } from '@/db/queries/snapshotHeads'
import { lineByHours } from '@/lib/panel/nights/lineByHours'
import { rawScores } from '@/lib/panel/statistics'
import type { ActingContext } from '../context'
import { openPanel, type ReadPanel } from '../panels/openPanel'
import { panelOffer } from '../sharing/panelOffer'
import { certainty, draws } from './certainty'
import { changesBetween } from './changesBetween'
import { visibleLine, visibleOrder } from './order'
import { readMeasure } from './readMeasure'
import { panelScores } from './panelScores'
import type { RankingView } from './rankingView'

/** The day the panel meets, as a number: the same draws for everyone who looks. */
const seedOf = (meets: Date) => Number(meets.toISOString().slice(0, 10).replaceAll('-', ''))

/** The ranking as its reader may see it: ranks, chances, leniency and totals all without what is kept from them. */
export async function readRanking(
  ctx: ActingContext,
  key: { callSlug: string; panelId?: number },
): Promise<RankingView> {
  return rankingOf(ctx, await openPanel(ctx, key))
}

/** The same of a panel that was opened already. */
export async function rankingOf(ctx: ActingContext, desk: ReadPanel): Promise<RankingView> {
  const { call, panel, hidden } = desk
  const ids = desk.proposals.map(({ id }) => id)
  const numbers = new Map(desk.proposals.map(({ id, reviewNumber }) => [id, reviewNumber]))
  const [heads, lines, members, assignments, ranking, moves, blocks] = await Promise.all([
    snapshotHeads(ctx.db, ids),
    requestLines(ctx.db, ids),
    panelMembers(ctx.db, panel.id),
    panelAssignments(ctx.db, panel.id),
    currentRanking(ctx.db, panel.id),
    movesByHand(ctx.db, panel.id),
    offeredTime(ctx.db, call.id),
  ])
  const own = assignments.filter((a) => numbers.has(a.proposalId))
  const scores = await panelScores(ctx, call.id, own)
  const numberOf = new Map(members.map(({ personId, number }) => [personId, number]))
  const offered = await panelOffer(ctx.db, call.id, panel.id)
  const linesOf = (id: number) => lines.filter((line) => line.proposalId === id)
  const entries = ranking ? await rankingEntries(ctx.db, ranking.id) : []
  const full = entries.map((entry) => entry.proposal_id)
  const seed = seedOf(call.panelMeetsAt)
  const byMean = rawScores(scores).map((one) => one.proposal)
  const order = ranking
    ? visibleOrder(full, hidden).filter((id) => numbers.has(id))
    : [...byMean, ...ids.filter((id) => !byMean.includes(id))]
  const asks = order.map((id) =>
    linesOf(id).map((one) => ({
      proposal: id,
      instrument: one.instrumentId,
      telescope: one.telescopeId,
      seconds: one.askedSeconds,
      least: one.askedSeconds,
      possible: true,
    })),
  )
  const line = ranking ? visibleLine(full, hidden, ranking.line_after ?? 0) : lineByHours(asks, offered)
  const sure = certainty(scores, numberOf, line, seed)
  const measure = await readMeasure(ctx, desk, own, sure.byProposal)
  const before = ranking ? await lastFrozenBefore(ctx.db, ranking) : null
  const frozen = before
    ? visibleOrder(
        (await rankingEntries(ctx.db, before.id)).map((entry) => entry.proposal_id),
        hidden,
      )
    : []
  const above = order.slice(0, line)
  return {
    panelId: panel.id,
    panelName: panel.name,
    callNumber: call.number,
    callSlug: call.slug,
    phase: desk.phase,
    list: ranking && {
      id: ranking.id,
      version: ranking.version,
      number: ranking.ranking_version,
      frozenAt: ranking.frozen_at?.toISOString() ?? null,
    },
    teamsOpen: await hasFrozenRanking(ctx.db, panel.id),
    line,
    rows: order.map((id, index) => ({
      ...none,
      ...sure.byProposal.get(id),
      proposalId: id,
      reviewNumber: numbers.get(id) ?? '',
      title: heads.get(id)?.title ?? '',
      rank: index + 1,
      lines: linesOf(id).map((one) => ({
        instrumentId: one.instrumentId,
        instrument: one.instrument,
        telescopeId: one.telescopeId,
        telescope: one.telescope,
        seconds: one.askedSeconds,
      })),
      askedSeconds: linesOf(id).reduce((sum, one) => sum + one.askedSeconds, 0),
      measure: measure.values.get(id) ?? null,
      measureRank: measure.ranks.get(id) ?? null,
      setAside: Boolean(entries.find((entry) => entry.proposal_id === id)?.set_aside_at),
      scores: scores
        .filter((one) => one.proposal === id)
        .map((one) => ({ reviewer: numberOf.get(one.reviewer) ?? 0, score: one.score }))
        .sort((a, b) => a.reviewer - b.reviewer),
      moves: moves
        .filter((move) => move.proposalId === id)
        .map(({ isUp, reason, by, at }) => ({ isUp, reason, by, at: at.toISOString() })),
    })),
    scores: scores.length,
    reviewers: new Set(scores.map((one) => one.reviewer)).size,
    owed: own.filter((a) => !a.finishedAt).length,
    telescopes: [...offered].map(([id, offeredSeconds]) => {
      const asked = lines.filter((one) => one.telescopeId === id && above.includes(one.proposalId))
      return {
        id,
        name: blocks.find((block) => block.telescopeId === id)?.telescope ?? '',
        offeredSeconds,
        askedSeconds: asked.reduce((sum, one) => sum + one.askedSeconds, 0),
        proposals: new Set(asked.map((one) => one.proposalId)).size,
      }
    }),
    leniency: sure.leniency,
    test: sure.test,
    corrected: sure.corrected,
    whyNot: sure.whyNot,
    agreement: sure.agreement,
    formula: measure.formula,
    draws,
    seed,
    changes: changesBetween(frozen, order, numbers),
  }
}

const none = {
  raw: null,
  spread: null,
  reviews: 0,
  rawRank: null,
  merit: null,
  meritRank: null,
  shift: null,
  error: null,
  chance: null,
  low: null,
  high: null,
  lowerHalf: null,
  upperHalf: null,
  why: null,
}
