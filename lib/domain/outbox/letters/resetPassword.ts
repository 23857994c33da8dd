import type { Letter } from '../letter'

export function resetPasswordLetter(to: { name: string }, url: string): Letter {
  return {
    template: 'reset-password',
    subject: 'Choose a new password',
    greeting: `Dear ${to.name},`,
    paragraphs: ['Open the link within ten minutes to choose a new password. It works once.'],
    action: { label: 'Choose a new password', url },
    closing: 'If you did not ask for this, leave the letter alone; your password stays as it is.',
  }
}
