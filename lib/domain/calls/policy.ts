import { no, unseen, yes, type Decision } from '@/lib/auth/decision'
import { holds, type Actor } from '../actor'
import type { Call } from './types'

/** Everyone reads a published call; one being planned is the office's alone. */
export function mayReadCall(actor: Actor | null, call: Pick<Call, 'stage'>): Decision {
  return call.stage !== 'planned' || holds(actor, 'office') ? yes : unseen('call')
}

/** The office alone opens, extends and closes calls. */
export function mayManageCalls(actor: Actor | null): Decision {
  return holds(actor, 'office') ? yes : no('role', 'Only the office manages calls.')
}
