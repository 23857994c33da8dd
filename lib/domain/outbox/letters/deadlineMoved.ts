import { formatUtcInstant } from '@/lib/format'
import type { Letter } from '../letter'

export function deadlineMoved(
  to: { name: string; reference: string },
  call: { number: number; closesAt: Date },
  url: string,
): Letter {
  return {
    template: 'deadline-moved',
    subject: `Call ${call.number}: the deadline has moved`,
    greeting: `Dear ${to.name},`,
    paragraphs: [`Your draft ${to.reference} can now be sent until ${formatUtcInstant(call.closesAt)}.`],
    action: { label: 'Open the draft', url },
  }
}
