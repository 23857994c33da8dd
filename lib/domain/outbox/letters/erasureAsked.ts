import type { Letter } from '../letter'

/** To the office: somebody asks that what is held about them be erased. */
export function erasureAsked(given: { name: string; asks: string; url: string }): Letter {
  return {
    template: 'erasure-asked',
    subject: `${given.asks} asks to be erased`,
    greeting: `Dear ${given.name},`,
    paragraphs: [
      `${given.asks} asks that what is held about them be erased. The page of the account says what would go, what has to stay, and what stands in the way.`,
    ],
    action: { label: 'Open the account', url: given.url },
    closing: 'The law gives a month to answer.',
  }
}
