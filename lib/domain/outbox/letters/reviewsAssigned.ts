import { countInWords, formatUtc } from '@/lib/format'
import type { Letter } from '../letter'

export interface AssignedWork {
  callNumber: number
  reviewNumbers: readonly string[]
  pages: number
  dueAt: Date
  /** Taking over from someone who cannot go on. */
  urgent: boolean
}

/** To a reviewer, about what was assigned just now: by review number, never by name. */
export function reviewsAssigned(to: { name: string }, work: AssignedWork, url: string): Letter {
  const count = countInWords(work.reviewNumbers.length, 'proposal', 'proposals')
  return {
    template: 'reviews-assigned',
    subject: work.urgent
      ? `Please take over ${count} of call ${work.callNumber}`
      : `Call ${work.callNumber}: ${count} for you to review`,
    greeting: `Dear ${to.name},`,
    paragraphs: [
      work.urgent
        ? `A colleague on the panel cannot go on, and the chair asks you to take over ${count}.`
        : `The chair of the panel has assigned you ${count} to review.`,
      'Before you open them, go through the list of names and say with whom you have an interest.',
    ],
    facts: [
      ['Review numbers', work.reviewNumbers.join(', ')],
      ['To read', `${work.pages} pages`],
      ['Reviews are due', formatUtc(work.dueAt)],
    ],
    action: { label: 'Open my reviews', url },
  }
}
