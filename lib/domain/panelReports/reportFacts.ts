import { panelsOfCall } from '@/db/queries/approvals'
import { callCriteria } from '@/db/queries/calls'
import { siteRecordAt } from '@/db/queries/facility'
import { heldTime } from '@/db/queries/nightTerms'
import { currentRanking } from '@/db/queries/rankings'
import { refuse } from '@/lib/errors'
import type { CallCriterion } from '../calls/types'
import type { ActingContext } from '../context'
import { decisionRows } from '../decisions/decisionRows'
import type { DecisionRow } from '../decisions/decisionsView'
import type { ReadPanel } from '../panels/openPanel'
import { rankingOf } from '../rankings/readRanking'
import type { RankingRow, RankingView } from '../rankings/rankingView'
import { readSharing } from '../sharing/readSharing'
import type { SharingView } from '../sharing/sharingView'
import { suppressSmall } from '../statistics/suppressSmall'
import { meetingFacts, type MeetingFacts } from './meetingFacts'

const outcomes = ['awarded', 'reserve', 'declined'] as const

export interface ReportRow {
  ranked: RankingRow
  /** Null where nothing was prepared for it. */
  decision: DecisionRow | null
}

/** What a panel did and recommends, without what the reader has an interest in. */
export interface ReportFacts {
  desk: ReadPanel
  observatory: string
  ranking: RankingView
  rows: ReportRow[]
  criteria: CallCriterion[]
  meeting: MeetingFacts
  telescopes: {
    name: string
    offeredSeconds: number
    heldSeconds: number
    givenSeconds: number
    reserveSeconds: number
  }[]
  /** Kinds of proposal with their counts of outcomes and the sum, the last all kinds; null where kept back. */
  counts: { kind: string; cells: (number | null)[] }[]
  /** Null in a call of one panel. */
  sharing: SharingView | null
}

/** Gathers the report of a panel whose ranking is frozen; refused before. */
export async function reportFacts(ctx: ActingContext, desk: ReadPanel): Promise<ReportFacts> {
  const frozen = await currentRanking(ctx.db, desk.panel.id)
  if (!frozen?.frozen_at) throw refuse.closed('Freeze the ranking first: the report rests on it.')
  const { call, panel, hidden, proposals } = desk
  const ranking = await rankingOf(ctx, desk)
  const [decisions, criteria, meeting, site, held, panels] = await Promise.all([
    decisionRows(ctx, { callId: call.id, panelId: panel.id, proposals, hidden, ranking: frozen }),
    callCriteria(ctx.db, call.id),
    meetingFacts(ctx, desk),
    siteRecordAt(ctx.db, call.siteId, call.seasonFrom),
    heldTime(ctx.db, call.id),
    panelsOfCall(ctx.db, call.id),
  ])
  const decisionOf = new Map(decisions.map((row) => [row.proposalId, row]))
  return {
    ...{ desk, ranking, criteria, meeting, observatory: site.name },
    rows: ranking.rows.map((ranked) => ({ ranked, decision: decisionOf.get(ranked.proposalId) ?? null })),
    telescopes: ranking.telescopes.map(({ id, name, offeredSeconds }) => {
      const instruments = new Set(
        ranking.rows
          .flatMap((row) => row.lines)
          .filter((line) => line.telescopeId === id)
          .map((line) => line.instrumentId),
      )
      const lines = decisions.flatMap((row) => row.lines).filter((line) => instruments.has(line.instrumentId))
      const sum = (isReserve: boolean) =>
        lines.reduce((total, line) => total + (line.isReserve === isReserve ? line.seconds : 0), 0)
      return {
        ...{ name, offeredSeconds, heldSeconds: held.get(id)?.seconds ?? 0 },
        ...{ givenSeconds: sum(false), reserveSeconds: sum(true) },
      }
    }),
    counts: countsOf(desk, decisions),
    sharing: panels.length > 1 ? await readSharing(ctx, call.slug) : null,
  }
}

/** Outcomes by kind of proposal; small counts are kept back, as the report may travel on. */
function countsOf({ proposals }: ReadPanel, decisions: readonly DecisionRow[]): ReportFacts['counts'] {
  const kindOf = new Map(proposals.map(({ id, kind }) => [id, kind]))
  const kinds = [...new Set(decisions.map(({ proposalId }) => kindOf.get(proposalId) ?? ''))].sort()
  const cells = suppressSmall(
    kinds.map((kind) =>
      outcomes.map(
        (outcome) =>
          decisions.filter((row) => kindOf.get(row.proposalId) === kind && row.outcome === outcome).length,
      ),
    ),
  )
  if (kinds.length === 0) return []
  return [...kinds, 'All kinds'].map((kind, index) => ({ kind, cells: cells[index] ?? [] }))
}
