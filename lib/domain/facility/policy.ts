import { no, yes, type Decision } from '@/lib/auth/decision'
import { holds, holdsForInstrument, type Actor } from '../actor'

/**
 * Records of sites and telescopes are the office's, and so is what there is at all: what retires is no longer offered,
 * and offers are the office's.
 */
export function mayEditFacility(actor: Actor | null): Decision {
  return holds(actor, 'office') ? yes : no('role', 'Only the office changes the records of the facility.')
}

/** The office, and the scientists of the instrument the mode belongs to. */
export function mayEditMode(actor: Actor | null, instrumentId: number): Decision {
  if (holds(actor, 'office')) return yes
  return actor !== null && holdsForInstrument(actor, instrumentId)
    ? yes
    : no('role', 'Only the office and the scientists of the instrument change its records.')
}
