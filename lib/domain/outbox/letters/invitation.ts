import type { Letter } from '../letter'

export function invitationLetter(
  to: { name: string },
  role: string,
  where: string | null,
  inviter: string,
  url: string,
): Letter {
  return {
    template: 'invitation',
    subject: `Invitation: ${role}${where ? `, ${where}` : ''}`,
    greeting: `Dear ${to.name},`,
    paragraphs: [
      `${inviter} invites you to act as ${role}${where ? ` for ${where}` : ''}. Open the link within 21 days to accept; if you have an account, you sign in with it.`,
    ],
    action: { label: 'Read the invitation', url },
    closing: 'The link is meant for you alone. If you cannot take part, write to the office.',
  }
}
