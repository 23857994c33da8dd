import { no, unseen, yes, type Decision } from '@/lib/auth/decision'
import { holdsForPanel, type Actor } from '../actor'

/**
 * Who leads a panel: its chair and its deputy, by role and by seat. To anyone else the panel's pages do not exist.
 * Both do the same things; whoever has an interest in a proposal never meets it, and the other acts.
 */
export function canLeadPanel(
  actor: Actor,
  panel: { id: number; callId: number; seat: 'chair' | 'deputy' | 'member' | null },
): Decision {
  if (panel.seat !== 'chair' && panel.seat !== 'deputy') return unseen('panel')
  return holdsForPanel(actor, 'chair', panel.callId, panel.id) ? yes : unseen('panel')
}

/** Who asks is opened once a ranking of the panel was frozen: what changes after that is a new version beside it. */
export function mayReadTeams(hasFrozenRanking: boolean): Decision {
  return hasFrozenRanking
    ? yes
    : no(
        'window',
        'Who asks is opened once the ranking is frozen. Until then proposals are read without names.',
      )
}
