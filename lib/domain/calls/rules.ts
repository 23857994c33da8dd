import type { Call, CallKind, CallPhase } from './types'

/** The phase a call is in at `now` (the database's clock). */
export function callPhase(call: Pick<Call, 'stage' | 'opensAt' | 'closesAt'>, now: Date): CallPhase {
  if (call.stage === 'planned') return 'planned'
  if (call.stage !== 'published') return call.stage
  if (now < call.opensAt) return 'planned'
  return now < call.closesAt ? 'open' : 'closed'
}

/** The deadline of one proposal: its own where the office gave one, else its kind's, else the call's. */
export function deadlineOf(
  call: Pick<Call, 'closesAt'>,
  kind: Pick<CallKind, 'closesAt'>,
  proposal: { closesAt: Date | null },
): Date {
  return proposal.closesAt ?? kind.closesAt ?? call.closesAt
}

/** A proposal may still be begun, edited or sent at `arrivedAt`. Exactly at the deadline it may not. */
export function takesProposals(
  call: Pick<Call, 'stage' | 'opensAt'>,
  deadline: Date,
  arrivedAt: Date,
): boolean {
  return call.stage === 'published' && arrivedAt >= call.opensAt && arrivedAt < deadline
}
