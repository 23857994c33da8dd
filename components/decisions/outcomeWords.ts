import type { Outcome } from '@/lib/domain/decisions/rules'

/** How a decision is told to the investigators. */
export const outcomeWords: Record<
  Outcome,
  { title: string; sentence: string; bar: 'feasible' | 'marginal' | 'lamp' }
> = {
  awarded: { title: 'Awarded', sentence: 'The panel has awarded time to your proposal.', bar: 'feasible' },
  reserve: {
    title: 'Reserve',
    sentence:
      'The panel holds your proposal in reserve: it is observed when time falls free, and you hear at once if so.',
    bar: 'marginal',
  },
  declined: {
    title: 'Declined',
    sentence: 'The panel could not give time to your proposal. What it says below may help the next one.',
    bar: 'lamp',
  },
}
