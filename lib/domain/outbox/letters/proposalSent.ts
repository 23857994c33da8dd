import { formatFingerprint, formatMoneyShort, formatUtcInstant, formatUtcWithYear } from '@/lib/format'
import type { Letter } from '../letter'

export interface SentFacts {
  name: string
  title: string
  reference: string
  callNumber: number
  versionNumber: number
  arrivedAt: Date
  deadline: Date
  sha256: string
  fee: { amountMinor: number; currency: string; dueAt: Date; state: string } | null
  url: string
}

/** To every investigator: it is in, when it arrived, and what is still to be settled. */
export function proposalSent(sent: SentFacts): Letter {
  const { fee } = sent
  const isOwed = fee?.state === 'due'
  return {
    template: 'proposal-sent',
    subject: `${sent.reference} is in: ${sent.title}`,
    greeting: `Dear ${sent.name},`,
    paragraphs: [
      `“${sent.title}” reached the observatory at ${formatUtcInstant(sent.arrivedAt)}. It is in for call ${sent.callNumber}.`,
      `Until ${formatUtcWithYear(sent.deadline)} it may be reopened or withdrawn. The version sent stands until another is sent.`,
      ...(fee && isOwed
        ? [
            `The fee of ${formatMoneyShort(fee.amountMinor, fee.currency)} is to be settled by ${formatUtcWithYear(fee.dueAt)}. If it has been paid a moment ago, a receipt follows.`,
          ]
        : []),
    ],
    facts: [
      ['Reference', sent.reference],
      ['Received', formatUtcInstant(sent.arrivedAt)],
      ['Version', String(sent.versionNumber)],
      ['Fingerprint', formatFingerprint(sent.sha256)],
    ],
    action: { label: 'See the confirmation', url: sent.url },
  }
}
