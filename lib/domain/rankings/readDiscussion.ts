import { panelAssignments } from '@/db/queries/assignments'
import { panelTexts } from '@/db/queries/panelTexts'
import { standingDecisions } from '@/db/queries/decisions'
import { assessedLines, panelMembers } from '@/db/queries/panel'
import type { ActingContext } from '../context'
import { readRanking } from './readRanking'
import { clearTail } from './rules'
import type { RankingRow, RankingView } from './rankingView'

export interface DiscussedProposal extends RankingRow {
  /** Reviewers by number, first reader and second voice named as such. */
  readers: { number: number; seat: 'first' | 'second' | 'reader'; isFinished: boolean }[]
  toPanel: { reviewer: number; body: string }[]
  toInvestigators: { reviewer: number; body: string }[]
  notes: {
    instrument: string
    verdict: 'accepted' | 'change' | 'not-possible'
    reason: string
    note: string
  }[]
  statement: string
  decisionVersion: number
}

export interface DiscussionView {
  ranking: RankingView
  proposals: DiscussedProposal[]
  /** How many at the end could not belong above the line, and are not set aside yet. */
  tail: number[]
}

/** The proposals in ranking order with what was said about each; reviewers by number only. */
export async function readDiscussion(
  ctx: ActingContext,
  key: { callSlug: string; panelId?: number },
): Promise<DiscussionView> {
  const ranking = await readRanking(ctx, key)
  const ids = ranking.rows.map((row) => row.proposalId)
  const [assignments, texts, members, decisions, assessed] = await Promise.all([
    panelAssignments(ctx.db, ranking.panelId),
    panelTexts(ctx.db, ids),
    panelMembers(ctx.db, ranking.panelId),
    standingDecisions(ctx.db, ids),
    assessedLines(ctx.db, ids),
  ])
  const numberOf = (personId: number) => members.find((m) => m.personId === personId)?.number ?? 0
  const seats = ['first', 'second', 'reader']
  const said = (id: number, audience: 'panel' | 'investigators') =>
    texts
      .filter((text) => text.proposalId === id && text.audience === audience)
      .map((text) => ({ reviewer: numberOf(text.personId), body: text.body }))
  const tail = clearTail(
    ranking.rows.map((row) => row.chance),
    ranking.line,
  )
  return {
    ranking,
    proposals: ranking.rows.map((row) => ({
      ...row,
      readers: assignments
        .filter((a) => a.proposalId === row.proposalId)
        .map((a) => ({ number: numberOf(a.personId), seat: a.seat, isFinished: a.finishedAt !== null }))
        .sort((a, b) => seats.indexOf(a.seat) - seats.indexOf(b.seat) || a.number - b.number),
      toPanel: said(row.proposalId, 'panel'),
      toInvestigators: said(row.proposalId, 'investigators'),
      notes: assessed
        .filter((one) => one.proposalId === row.proposalId)
        .map((one) => ({
          instrument: row.lines.find((line) => line.instrumentId === one.instrumentId)?.instrument ?? '',
          verdict: one.verdict,
          reason: one.reason,
          note: one.panelNote,
        })),
      statement: decisions.get(row.proposalId)?.statement ?? '',
      decisionVersion: decisions.get(row.proposalId)?.version ?? 0,
    })),
    tail: ranking.rows
      .slice(ranking.rows.length - tail)
      .filter((row) => !row.setAside)
      .map((row) => row.proposalId),
  }
}
