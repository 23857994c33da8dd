import type { Letter } from '../letter'

/** To whoever asked: the answer came. Only the review number, no names. */
export function staffAnswer(given: {
  name: string
  reviewNumber: string
  answer: string
  url: string
}): Letter {
  return {
    template: 'staff-answer',
    subject: `An answer about ${given.reviewNumber}`,
    greeting: `Dear ${given.name},`,
    paragraphs: [`The investigators of ${given.reviewNumber} answer your question:`, given.answer],
    action: { label: `Open ${given.reviewNumber}`, url: given.url },
  }
}
