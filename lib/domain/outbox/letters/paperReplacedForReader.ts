import type { Letter } from '../letter'

/** To a reviewer: the packet holds another justification now. Names nobody. */
export function paperReplacedForReader(facts: { name: string; reviewNumber: string }, url: string): Letter {
  return {
    template: 'paper-replaced',
    subject: `${facts.reviewNumber}: the justification has been replaced`,
    greeting: `Dear ${facts.name},`,
    paragraphs: [
      `The file first sent as the justification of ${facts.reviewNumber} was the wrong one. The office has let it be replaced, and the packet holds the right one now.`,
      'Please read it again. What you have written and scored is kept, and can be changed.',
    ],
    action: { label: 'Read the packet', url },
  }
}
