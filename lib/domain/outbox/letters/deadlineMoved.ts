import { formatList, formatUtcInstant } from '@/lib/format'
import type { Letter } from '../letter'

/** To everyone with a draft the call's deadline holds for: until when, and why. One letter, however many drafts. */
export function deadlineMoved(
  to: { name: string; references: readonly string[] },
  call: { number: number; closesAt: Date; why: string },
  url: string,
): Letter {
  const drafts = to.references.length === 1 ? 'Your draft' : 'Your drafts'
  return {
    template: 'deadline-moved',
    subject: `Call ${call.number}: the deadline has moved`,
    greeting: `Dear ${to.name},`,
    paragraphs: [
      `${drafts} ${formatList(to.references)} can now be sent until ${formatUtcInstant(call.closesAt)}.`,
      call.why,
    ],
    action: { label: `Open the ${to.references.length === 1 ? 'draft' : 'drafts'}`, url },
  }
}
