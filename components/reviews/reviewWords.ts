import type { ReviewState } from '@/lib/domain/reviews/types'

/** How far a review is, in words. */
export const reviewWords: Record<ReviewState, string> = {
  'to-read': 'to read',
  begun: 'begun',
  finished: 'finished',
}
