import { findCall, findCallBySlug } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { lockPanel, panelProposals, type LedPanel, type PanelProposal } from '@/db/queries/panel'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { callPhase } from '../calls/rules'
import type { Call, CallPhase } from '../calls/types'
import { barredFrom } from '../conflicts/barredPairs'
import type { ActingContext } from '../context'
import { ledPanels } from './ledPanels'
import { canLeadPanel } from './policy'

/** A panel as its leader may see it: proposals in which they have an interest are not in it, nor counted. */
export interface PanelDesk {
  call: Call
  phase: CallPhase
  now: Date
  panel: LedPanel
  /** Other panels of the call the person leads. */
  others: LedPanel[]
  proposals: PanelProposal[]
  /** Proposals kept from this person. Never shown; needed to keep places and totals right for everyone. */
  hidden: ReadonlySet<number>
}

/** A panel opened for reading alone, by someone with or without a seat on it. */
export type ReadPanel = Omit<PanelDesk, 'panel' | 'others'> & { panel: Omit<LedPanel, 'seat'> }

/** Which panel: the one named, else the first of the call the person leads. */
export type PanelKey = { callSlug: string; panelId?: number } | { panelId: number; lock: true }

/** Opens the panel for reading, or, with `lock`, for writing in the caller's transaction. */
export async function openPanel(ctx: ActingContext, key: PanelKey): Promise<PanelDesk> {
  const call = 'lock' in key ? await lockedCall(ctx, key.panelId) : await findCallBySlug(ctx.db, key.callSlug)
  if (!call) throw refuse.notFound('panel')
  const led = await ledPanels(ctx, call.id)
  const panel = led.find((seat) => key.panelId === undefined || seat.id === key.panelId)
  if (!panel) throw refuse.notFound('panel')
  authorize(canLeadPanel(ctx.actor, { ...panel, callId: call.id }))
  const hidden = await barredFrom(ctx.db, ctx.actor.personId, call.id)
  const now = await databaseNow(ctx.db)
  const all = await panelProposals(ctx.db, panel.id)
  return {
    call,
    phase: callPhase(call, now),
    now,
    panel,
    others: led.filter((seat) => seat !== panel),
    proposals: all.filter(({ id }) => !hidden.has(id)),
    hidden,
  }
}

async function lockedCall(ctx: ActingContext, panelId: number): Promise<Call | null> {
  const panel = await lockPanel(ctx.db, panelId)
  return panel ? findCall(ctx.db, panel.callId) : null
}

/** The proposal, if this person may see it; else it does not exist. */
export function visibleProposal(desk: PanelDesk, proposalId: number): PanelProposal {
  const proposal = desk.proposals.find(({ id }) => id === proposalId)
  if (!proposal) throw refuse.notFound('proposal')
  return proposal
}
