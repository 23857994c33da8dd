import { formatUtcInstant } from '@/lib/format'
import type { Letter } from '../letter'

/** To those who lead a proposal: one paper may be replaced, once, until a moment. */
export function repairOpened(
  facts: {
    name: string
    reference: string
    kind: 'justification' | 'team-expertise'
    reason: string
    openUntil: Date
  },
  url: string,
): Letter {
  const paper = facts.kind === 'justification' ? 'justification' : 'document on the team'
  return {
    template: 'repair-opened',
    subject: `${facts.reference}: the ${paper} may be replaced`,
    greeting: `Dear ${facts.name},`,
    paragraphs: [
      `Something is wrong with the ${paper} of ${facts.reference}: ${facts.reason}`,
      `It may be replaced once, until ${formatUtcInstant(facts.openUntil)}. Nothing else of the proposal can be changed. Both files are kept; the panel reads the new one.`,
    ],
    action: { label: 'Put in the right file', url },
  }
}
