import { no, yes, type Decision } from '@/lib/auth/decision'
import { holds, type Actor } from '../actor'

/** The whole logbook is the office's; a proposal's own part is read on the proposal. */
export function mayReadLogbook(actor: Actor | null): Decision {
  return holds(actor, 'office') ? yes : no('role', 'Only the office reads the logbook.')
}
