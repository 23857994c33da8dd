import { no, yes, type Decision } from '@/lib/auth/decision'
import { holds, type Actor } from '../actor'

/** Only the office writes to many. */
export function mayWriteToMany(actor: Actor | null): Decision {
  return holds(actor, 'office') ? yes : no('role', 'Only the office writes to many.')
}
