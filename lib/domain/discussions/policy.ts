import { unseen, yes, type Decision } from '@/lib/auth/decision'
import { holdsForPanel, type Actor } from '../actor'

/** Who sits at a panel's table: its members, by seat and by the role of reviewer or chair. To others it does not exist. */
export function canSitAtTable(actor: Actor, panel: { id: number; callId: number }): Decision {
  const holds = (role: 'reviewer' | 'chair') => holdsForPanel(actor, role, panel.callId, panel.id)
  return holds('reviewer') || holds('chair') ? yes : unseen('panel')
}
