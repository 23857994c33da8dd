import type { Database } from '@/db/client'
import { findInstrumentName, findPanelScope } from '@/db/queries/panelScopes'
import { refuse } from '@/lib/errors'

export interface RoleScopeFound {
  callId: number | null
  panelId: number | null
  instrumentId: number | null
  /** `the panel Extragalactic of call 14`, `EMBER`, or null for the whole observatory. */
  where: string | null
}

/** The panel or instrument a role is for, looked up; refused at its field when there is no such. */
export async function findScope(
  db: Database,
  input: { role: string; panelId: string; instrumentId: string },
): Promise<RoleScopeFound> {
  if (input.role === 'reviewer' || input.role === 'chair') {
    const panel = await findPanelScope(db, Number(input.panelId))
    if (!panel) throw refuse.field('panelId', 'There is no such panel.')
    const where = `the panel ${panel.name} of call ${panel.callNumber}`
    return { callId: panel.callId, panelId: panel.id, instrumentId: null, where }
  }
  if (input.role === 'instrument-scientist') {
    const instrument = await findInstrumentName(db, Number(input.instrumentId))
    if (!instrument) throw refuse.field('instrumentId', 'There is no such instrument.')
    return { callId: null, panelId: null, instrumentId: instrument.id, where: instrument.name }
  }
  return { callId: null, panelId: null, instrumentId: null, where: null }
}
