import { countInWords, formatUtc } from '@/lib/format'
import type { Letter } from '../letter'

export function reviewReminder(
  to: { name: string },
  owed: { callNumber: number; reviewNumbers: readonly string[]; dueAt: Date; isLate: boolean },
  url: string,
): Letter {
  const count = countInWords(owed.reviewNumbers.length, 'review', 'reviews')
  return {
    template: 'review-reminder',
    subject: `Call ${owed.callNumber}: ${count} still to come`,
    greeting: `Dear ${to.name},`,
    paragraphs: [
      owed.isLate
        ? `The panel still waits for ${count} of yours, which were due on ${formatUtc(owed.dueAt)}. They count until the panel meets.`
        : `The panel waits for ${count} of yours. They are due on ${formatUtc(owed.dueAt)}.`,
      'If you cannot finish in time, write to the chair soon, so that someone can take over.',
    ],
    facts: [['Review numbers', owed.reviewNumbers.join(', ')]],
    action: { label: 'Open my reviews', url },
  }
}
