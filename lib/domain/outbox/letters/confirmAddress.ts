import type { Letter } from '../letter'

export function confirmAddress(to: { name: string }, url: string): Letter {
  return {
    template: 'confirm-address',
    subject: 'Confirm your address',
    greeting: `Dear ${to.name},`,
    paragraphs: [
      'You asked for an account with this address. Open the link within two days to show that it is yours.',
    ],
    action: { label: 'Confirm this address', url },
    closing: 'If it was not you, leave this letter alone: without the link nothing happens.',
  }
}
