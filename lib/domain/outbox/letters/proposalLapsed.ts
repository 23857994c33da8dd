import { formatUtcWithYear } from '@/lib/format'
import type { Letter } from '../letter'

/** To every investigator: the fee was not settled, and the proposal is out of the call. */
export function proposalLapsed(facts: {
  name: string
  title: string
  reference: string
  dueAt: Date
  url: string
}): Letter {
  return {
    template: 'proposal-lapsed',
    subject: `${facts.reference} has lapsed`,
    greeting: `Dear ${facts.name},`,
    paragraphs: [
      `The fee for “${facts.title}” was to be settled by ${formatUtcWithYear(facts.dueAt)} and was not. The proposal is out of the call; nothing is owed.`,
      'If you did pay, or asked for a waiver, write to the office and name the reference.',
    ],
    action: { label: 'See the proposal', url: facts.url },
  }
}
