import type { Letter } from '../letter'

export interface LeadTaken {
  toName: string
  byName: string
  title: string
  reference: string
  url: string
}

/** To whoever led a proposal before: who leads it now, and what they may still do. */
export function leadTaken(given: LeadTaken): Letter {
  return {
    template: 'lead-taken',
    subject: `${given.reference}: ${given.byName} leads it now`,
    greeting: `Dear ${given.toName},`,
    paragraphs: [
      `${given.byName} has accepted, and is the principal investigator of “${given.title || 'the proposal'}” from now on.`,
      'You stay on it as a deputy: you may change the proposal, send it and name people.',
    ],
    action: { label: 'See who is named', url: given.url },
  }
}
