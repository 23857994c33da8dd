import type { CallPhase } from '@/lib/domain/calls/types'

/** Phases of a call in words. */
export const phaseWords: Readonly<Record<CallPhase, string>> = {
  planned: 'planned',
  open: 'open',
  closed: 'closed, being assessed',
  review: 'in review',
  ranking: 'being ranked',
  decided: 'decided',
  archived: 'archived',
}
