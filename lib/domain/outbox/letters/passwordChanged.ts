import type { Letter } from '../letter'

export function passwordChanged(to: { name: string }, forgotUrl: string): Letter {
  return {
    template: 'password-changed',
    subject: 'Your password was changed',
    greeting: `Dear ${to.name},`,
    paragraphs: [
      'The password of your account was changed just now, and every other browser was signed out.',
    ],
    action: { label: 'It was not me: choose another', url: forgotUrl },
  }
}
