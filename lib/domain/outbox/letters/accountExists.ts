import type { Letter } from '../letter'

export function accountExists(to: { name: string }, forgotUrl: string): Letter {
  return {
    template: 'account-exists',
    subject: 'You have an account already',
    greeting: `Dear ${to.name},`,
    paragraphs: [
      'Someone, perhaps you, asked for an account with this address. There is one already. If you do not remember its password, choose a new one.',
    ],
    action: { label: 'Choose a new password', url: forgotUrl },
    closing: 'If it was not you, leave this letter alone.',
  }
}
