import { no, unseen, yes, type Decision } from '@/lib/auth/decision'
import { holdsForPanel, type Actor } from '../actor'
import { callPhase } from '../calls/rules'
import type { Call } from '../calls/types'

/** Reviewers of a call go through its names once the call has closed: before that the list is not whole. */
export function canDeclareInterests(
  actor: Actor,
  call: Pick<Call, 'id' | 'stage' | 'opensAt' | 'closesAt'>,
  now: Date,
): Decision {
  if (!holdsForPanel(actor, 'reviewer', call.id, null)) return unseen('call')
  const phase = callPhase(call, now)
  if (phase === 'planned' || phase === 'open')
    return no('window', 'The list of names is whole once the call has closed.')
  return phase === 'archived' ? no('window', 'This call is put away.') : yes
}

/** A declaration holds until a proposal arrives after it, by an exception the office made. */
export function declarationHolds(declaredAt: Date | null, lastLateArrival: Date | null): boolean {
  return declaredAt !== null && (lastLateArrival === null || lastLateArrival <= declaredAt)
}
