import { no, yes, type Decision } from '@/lib/auth/decision'
import { holds, type Actor } from '../actor'

/** The outbox is the office's. */
export function mayReadOutbox(actor: Actor | null): Decision {
  return holds(actor, 'office') ? yes : no('role', 'Only the office reads the outbox.')
}
