import { no, unseen, yes, type Decision } from '@/lib/auth/decision'
import { holds, type Actor } from '../actor'

/** Who reads how the panels of a call share the time: whoever leads one of them, and the office. To others it is not there. */
export function maySeeSharing(actor: Actor, leads: boolean): Decision {
  return leads || holds(actor, 'office') ? yes : unseen('panel')
}

/** Chairs, deputies and office lay down a rule that follows from what is asked; percents are the office's alone. */
export function mayWriteShareRule(
  actor: Actor,
  leads: boolean,
  rule: 'hours' | 'proposals' | 'fixed',
): Decision {
  if (holds(actor, 'office')) return yes
  if (!leads) return unseen('panel')
  return rule === 'fixed' ? no('role', 'Fixed shares are written by the office.') : yes
}

/** Only those who lead a panel of the call order proposals at the meeting. */
export function maySitAtMerge(leads: boolean): Decision {
  return leads ? yes : no('role', 'Chairs and deputies order the proposals; the office reads.')
}
