import type { Letter } from '../letter'

/** To whoever was erased, once, to the address as it was: it is done, what stays, and that nobody can write again. */
export function personErased(given: { name: string; stays: readonly string[] }): Letter {
  return {
    template: 'person-erased',
    subject: 'What was held about you has been erased',
    greeting: `Dear ${given.name},`,
    paragraphs: [
      'Your account and what was held about you have been erased, as was asked for. You cannot sign in any more, and this is the last letter you get.',
      ...(given.stays.length > 0
        ? ['Some of it has to stay, where possible under no name:', ...given.stays]
        : ['Nothing of it had to stay but the deeds in the logbook, under no name.']),
      'This letter was sent to the address as it was. Once it has gone out, the address is blotted out here too.',
    ],
    closing: 'If you want to take part again, register as anybody does.',
  }
}
