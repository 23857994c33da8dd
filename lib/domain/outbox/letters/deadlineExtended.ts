import { formatUtcInstant } from '@/lib/format'
import type { Letter } from '../letter'

/** To everyone on one proposal: until when it alone may be sent. */
export function deadlineExtended(
  facts: { name: string; reference: string; call: { number: number }; closesAt: Date; why: string },
  url: string,
): Letter {
  return {
    template: 'deadline-extended',
    subject: `${facts.reference} may be sent until ${formatUtcInstant(facts.closesAt)}`,
    greeting: `Dear ${facts.name},`,
    paragraphs: [
      `The office has given ${facts.reference} a deadline of its own in call ${facts.call.number}: ${formatUtcInstant(facts.closesAt)}. It holds for this proposal only.`,
      `The reason on record: ${facts.why}`,
    ],
    action: { label: 'Open the proposal', url },
  }
}
