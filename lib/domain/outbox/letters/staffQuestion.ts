import { formatUtc } from '@/lib/format'
import type { Letter } from '../letter'

/** To the investigators: the staff of an instrument ask something. Nobody of the staff is named. */
export function staffQuestion(given: {
  name: string
  reference: string
  instrument: string
  question: string
  dueAt: Date
  url: string
}): Letter {
  return {
    template: 'staff-question',
    subject: `A question about ${given.reference} from the staff of ${given.instrument}`,
    greeting: `Dear ${given.name},`,
    paragraphs: [
      `The staff of ${given.instrument} are assessing ${given.reference} and ask:`,
      given.question,
      'Your answer goes to them without names, and stands beside their assessment.',
    ],
    facts: [['Answer by', formatUtc(given.dueAt)]],
    action: { label: 'Answer', url: given.url },
  }
}
