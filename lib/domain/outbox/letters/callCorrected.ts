import type { Letter } from '../letter'

/** To everyone on a proposal of the call: what was wrong in it, and what holds. */
export function callCorrected(
  facts: { name: string; callNumber: number; concerns: string; body: string },
  url: string,
): Letter {
  return {
    template: 'call-corrected',
    subject: `Call ${facts.callNumber} is corrected: ${facts.concerns}`,
    greeting: `Dear ${facts.name},`,
    paragraphs: [
      `The text of call ${facts.callNumber} has been corrected while your proposal is being prepared.`,
      ...facts.body.split(/\n{2,}/),
    ],
    facts: [['Concerns', facts.concerns]],
    action: { label: 'Read the call', url },
  }
}
