import type { Letter } from '../letter'

export interface LeadOffered {
  toName: string
  byName: string
  title: string
  reference: string
  callTitle: string
  url: string
}

/** To a member who is asked to lead a proposal: what it means, and where to say yes or no. */
export function leadOffered(given: LeadOffered): Letter {
  return {
    template: 'lead-offered',
    subject: `${given.reference}: ${given.byName} asks you to lead it`,
    greeting: `Dear ${given.toName},`,
    paragraphs: [
      `${given.byName} asks you to become the principal investigator of “${given.title || 'a proposal without a title'}”. Nothing changes before you accept.`,
      'The principal investigator answers for the proposal, says who is named on it, and is written to about its fee and its outcome.',
    ],
    facts: [
      ['Reference', given.reference],
      ['Call', given.callTitle],
    ],
    action: { label: 'Accept or decline', url: given.url },
  }
}
