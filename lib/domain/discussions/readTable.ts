import { panelAssignments } from '@/db/queries/assignments'
import { findCallBySlug } from '@/db/queries/calls'
import { tableOfPanel } from '@/db/queries/discussion'
import { panelMembers, panelProposals, requestLines, seatsHeld } from '@/db/queries/panel'
import { snapshotHeads } from '@/db/queries/snapshotHeads'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { barredFrom } from '../conflicts/barredPairs'
import type { ActingContext } from '../context'
import { canLeadPanel } from '../panels/policy'
import { canSitAtTable } from './policy'
import { readScoresAtTable } from './readScoresAtTable'
import type { TableView } from './tableView'

const nothing = { proposal: null, scores: [], meanBefore: null, meanAfter: null, own: null }

/** What lies on the table of a panel its reader sits on; of what they have an interest in, only that they wait. */
export async function readTable(
  ctx: ActingContext,
  key: { callSlug: string; panelId?: number },
): Promise<TableView> {
  const call = await findCallBySlug(ctx.db, key.callSlug)
  if (!call) throw refuse.notFound('panel')
  const me = ctx.actor.personId
  const seats = await seatsHeld(ctx.db, call.id, me)
  const panel = seats.find(({ id }) => key.panelId === undefined || id === key.panelId)
  if (!panel) throw refuse.notFound('panel')
  authorize(canSitAtTable(ctx.actor, { ...panel, callId: call.id }))
  const leads = canLeadPanel(ctx.actor, { ...panel, callId: call.id }).allowed
  const [table, members, hidden] = await Promise.all([
    tableOfPanel(ctx.db, panel.id),
    panelMembers(ctx.db, panel.id),
    barredFrom(ctx.db, me, call.id),
  ])
  const base = {
    panelId: panel.id,
    panelName: panel.name,
    callSlug: call.slug,
    callNumber: call.number,
    quorum: panel.quorum,
    me: { personId: me, isPresent: table.present.has(me), leads },
    present: members.filter(({ personId }) => table.present.has(personId)).length,
    members: leads
      ? members.map(({ personId, number, name }) => ({
          personId,
          number,
          name,
          isPresent: table.present.has(personId),
        }))
      : [],
  }
  const id = table.proposalId
  const proposal =
    id === null ? undefined : (await panelProposals(ctx.db, panel.id)).find((one) => one.id === id)
  if (id === null || !proposal) return { ...base, ...nothing, status: 'none', since: null }
  if (hidden.has(id)) return { ...base, ...nothing, status: 'apart', since: null }
  const [heads, lines, assignments] = await Promise.all([
    snapshotHeads(ctx.db, [id]),
    requestLines(ctx.db, [id]),
    panelAssignments(ctx.db, panel.id),
  ])
  return {
    ...base,
    status: 'now',
    since: table.since?.toISOString() ?? null,
    proposal: {
      proposalId: id,
      reviewNumber: proposal.reviewNumber,
      title: heads.get(id)?.title ?? '',
      lines: lines.map(({ instrument, askedSeconds }) => ({ instrument, seconds: askedSeconds })),
    },
    ...(await readScoresAtTable(
      ctx,
      call.id,
      assignments.filter((one) => one.proposalId === id),
      new Map(members.map(({ personId, number }) => [personId, number])),
    )),
  }
}
