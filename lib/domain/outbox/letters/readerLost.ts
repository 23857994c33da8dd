import { countInWords, formatList, formatUtc } from '@/lib/format'
import type { Letter } from '../letter'

/** To whoever leads a panel: a reviewer has an interest in what was assigned. By review number; the interest is not told. */
export function readerLost(given: {
  name: string
  reviewer: string
  callNumber: number
  /** Each proposal with the readers it still has. */
  proposals: readonly { reviewNumber: string; readersLeft: number }[]
  dueAt: Date
  url: string
}): Letter {
  const numbers = given.proposals.map(({ reviewNumber }) => reviewNumber)
  const one = numbers.length === 1
  return {
    template: 'reader-lost',
    subject: `Call ${given.callNumber}: ${formatList(numbers)} ${one ? 'has' : 'have'} lost a reader`,
    greeting: `Dear ${given.name},`,
    paragraphs: [
      `${given.reviewer} has declared an interest in ${formatList(numbers)}, and no longer reads ${one ? 'it' : 'them'}.`,
      'What was scored and written there is no longer counted. You may want to assign someone else.',
    ],
    facts: [
      ...given.proposals.map(
        ({ reviewNumber, readersLeft }) =>
          [reviewNumber, `${countInWords(readersLeft, 'reader', 'readers')} left`] as const,
      ),
      ['Reviews are due', formatUtc(given.dueAt)],
    ],
    action: { label: 'See the assignments', url: given.url },
  }
}
