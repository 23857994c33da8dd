import { refuse, type Refusal } from '@/lib/errors'

/** The review was finished or opened again in another window of the same person. */
export function staleReview(version: number, now: Date): Refusal {
  return refuse.stale({
    changedBy: 'You, in another window,',
    changedAt: now.toISOString(),
    version,
    theirs: {},
  })
}
