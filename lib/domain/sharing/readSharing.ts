import {
  currentMerged,
  lastFrozenMerged,
  mergedEntries,
  mergeMoves,
  type MergeMove,
} from '@/db/queries/mergedLists'
import { firstFrozenPanel, shareRules } from '@/db/queries/shareRules'
import { snapshotHeads } from '@/db/queries/snapshotHeads'
import type { MergedEntriesRow } from '@/db/tables'
import { nearLines } from '@/lib/panel/sharing/nearLines'
import { holds } from '../actor'
import type { ActingContext } from '../context'
import { changesBetween } from '../rankings/changesBetween'
import { isStale } from './isStale'
import { openCallPanels } from './openCallPanels'
import { orderByRule } from './orderByRule'
import { panelLists, type PanelList } from './panelLists'
import { whyNotTogether, whyRuleIsFixed } from './rules'
import { sharedTime, type SharedTime } from './sharedTime'
import type { SharingView } from './sharingView'

type Row = SharingView['rows'][number]

/** How the panels of a call share the time, and their lists as one, without what the reader has an interest in. */
export async function readSharing(ctx: ActingContext, slug: string): Promise<SharingView> {
  const { call, phase, panels, led, hidden } = await openCallPanels(ctx, { slug })
  const lists = await panelLists(ctx.db, panels)
  const [time, written, frozenPanel, list, moves] = await Promise.all([
    sharedTime(ctx.db, call.id, lists),
    shareRules(ctx.db, call.id),
    firstFrozenPanel(ctx.db, call.id),
    currentMerged(ctx.db, call.id),
    mergeMoves(ctx.db, call.id),
  ])
  const why = whyNotTogether(
    phase,
    lists.map((one) => ({ name: one.name, list: one.list, proposals: one.proposals.length })),
  )
  const isSeen = (id: number) => !hidden.has(id)
  const entries = list
    ? (await mergedEntries(ctx.db, list.id)).filter((one) => isSeen(one.proposal_id))
    : null
  const isComplete = lists.every((one) => one.proposals.length === 0 || one.list === 'frozen')
  const order = entries ?? (isComplete && panels.length > 1 ? 'by rule' : [])
  const before = list ? await lastFrozenMerged(ctx.db, call.id, list.list_version) : null
  const frozen = before ? (await mergedEntries(ctx.db, before.id)).map((one) => one.proposal_id) : []
  const rows = await rowsOf(ctx, { lists, time, order, moves, isSeen })
  const numberOf = new Map(rows.map((row) => [row.proposalId, row.reviewNumber]))
  return {
    ...{ callId: call.id, callNumber: call.number, callSlug: call.slug, phase },
    reader: { leads: led.length > 0, isOffice: holds(ctx.actor, 'office') },
    ...{ rule: time.rule, percents: time.percents },
    written: written.map((one) => ({ ...one, at: one.at.toISOString() })),
    ruleFixed: whyRuleIsFixed(phase, panels.length, frozenPanel),
    panels: lists.map((one) => ({
      ...{ id: one.panelId, name: one.name, proposals: one.proposals.length },
      ...{ list: one.list, listVersion: one.listVersion },
    })),
    pools: poolsOf(time, lists),
    rows,
    list: list && {
      ...{ id: list.id, version: list.version, number: list.list_version },
      frozenAt: list.frozen_at?.toISOString() ?? null,
      isStale: isStale(await mergedEntries(ctx.db, list.id), lists),
    },
    whyNotTogether: why,
    changes: changesBetween(
      frozen.filter(isSeen),
      rows.map((row) => row.proposalId),
      numberOf,
    ),
  }
}

function poolsOf({ pools, claims, shares }: SharedTime, lists: readonly PanelList[]): SharingView['pools'] {
  return pools.map(({ id, name, seconds, heldSeconds }) => ({
    ...{ id, name, heldSeconds, offeredSeconds: seconds },
    panels: lists.map(({ panelId }) => {
      const claim = claims.find((one) => one.pool === id && one.panel === panelId)
      const share = shares.find((one) => one.pool === id && one.panel === panelId)
      return {
        panelId,
        askedSeconds: claim?.seconds ?? 0,
        proposals: claim?.proposals ?? 0,
        shareSeconds: share?.seconds ?? 0,
      }
    }),
  }))
}

/** The order as its reader sees it: what is used is counted over what they see, so that nothing else shows through. */
async function rowsOf(
  ctx: ActingContext,
  given: {
    lists: readonly PanelList[]
    time: SharedTime
    order: readonly MergedEntriesRow[] | 'by rule'
    moves: readonly MergeMove[]
    isSeen: (id: number) => boolean
  },
): Promise<Row[]> {
  const { lists, time, order, moves, isSeen } = given
  const byRule = orderByRule(lists, time.shares, isSeen)
  const byProposal = new Map(byRule.map((entry) => [entry.proposal, entry]))
  const near = nearLines(byRule)
  const places =
    order === 'by rule'
      ? byRule.map(({ proposal }, index) => ({ id: proposal, isNear: near[index] ?? false }))
      : order.map((entry) => ({ id: entry.proposal_id, isNear: Boolean(entry.is_near) }))
  const heads = await snapshotHeads(
    ctx.db,
    places.map(({ id }) => id),
  )
  return places.flatMap(({ id, isNear }, index): Row[] => {
    const list = lists.find(({ proposals }) => proposals.some((one) => one.id === id))
    const entry = byProposal.get(id)
    if (!list) return []
    return [
      {
        ...{ proposalId: id, place: index + 1, isNear, panelId: list.panelId, panel: list.name },
        reviewNumber: list.proposals.find((one) => one.id === id)?.reviewNumber ?? '',
        title: heads.get(id)?.title ?? '',
        rank: entry?.rank ?? list.order.filter(isSeen).indexOf(id) + 1,
        lines: list.lines
          .filter(({ proposalId }) => proposalId === id)
          .map(({ instrument, telescopeId, askedSeconds }) => ({
            ...{ instrument, telescopeId },
            seconds: askedSeconds,
          })),
        used: entry && Number.isFinite(entry.used) ? entry.used : null,
        moves: moves
          .filter((move) => move.proposalId === id)
          .map(({ isUp, reason, by, at }) => ({ isUp, reason, by, at: at.toISOString() })),
      },
    ]
  })
}
