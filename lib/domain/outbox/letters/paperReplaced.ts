import { formatFingerprint, formatUtcInstant } from '@/lib/format'
import type { Letter } from '../letter'

/** To every investigator: the version with the right file is in. It is the confirmation of that version. */
export function paperReplaced(
  facts: {
    name: string
    reference: string
    fileName: string
    versionNumber: number
    arrivedAt: Date
    sha256: string
  },
  url: string,
): Letter {
  return {
    template: 'proposal-sent',
    subject: `${facts.reference}: a file has been replaced`,
    greeting: `Dear ${facts.name},`,
    paragraphs: [
      `${facts.fileName} took the place of the file that was sent, with leave of the office. Everything else stands as it was sent, and the earlier version is kept.`,
    ],
    facts: [
      ['Reference', facts.reference],
      ['Received', formatUtcInstant(facts.arrivedAt)],
      ['Version', String(facts.versionNumber)],
      ['Fingerprint', formatFingerprint(facts.sha256)],
    ],
    action: { label: 'See the confirmation', url },
  }
}
