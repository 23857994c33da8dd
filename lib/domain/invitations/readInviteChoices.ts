import { listInstrumentNames, listPanelScopes } from '@/db/queries/panelScopes'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { mayInvite } from './policy'

export interface InviteChoices {
  panels: { value: string; label: string }[]
  instruments: { value: string; label: string }[]
}

/** Panels and instruments somebody can be invited to. */
export async function readInviteChoices(ctx: ActingContext): Promise<InviteChoices> {
  authorize(mayInvite(ctx.actor))
  const [panels, instruments] = await Promise.all([listPanelScopes(ctx.db), listInstrumentNames(ctx.db)])
  return {
    panels: panels.map((panel) => ({
      value: String(panel.id),
      label: `${panel.name}, call ${panel.callNumber}`,
    })),
    instruments: instruments.map((instrument) => ({ value: String(instrument.id), label: instrument.name })),
  }
}
