import { formatUtcWithYear } from '@/lib/format'
import type { Letter } from '../letter'

/** To whoever was given a role: what it is for, and for how long. */
export function roleGiven(given: {
  name: string
  role: string
  /** `the panel Extragalactic of call 14`, `EMBER`; null for the whole observatory. */
  where: string | null
  fromAt: Date | null
  untilAt: Date | null
  url: string
}): Letter {
  const { role, where, fromAt, untilAt } = given
  const times: (readonly [string, string])[] = [
    ['From', fromAt ? formatUtcWithYear(fromAt) : 'now on'],
    ['Until', untilAt ? formatUtcWithYear(untilAt) : 'further notice'],
  ]
  return {
    template: 'role-given',
    subject: `You are ${role}${where ? ` for ${where}` : ''}`,
    greeting: `Dear ${given.name},`,
    paragraphs: [
      `The office has given your account the role of ${role}${where ? ` for ${where}` : ''}. Nothing needs to be accepted: what belongs to it is there when you sign in.`,
    ],
    facts: times,
    action: { label: 'See your desks', url: given.url },
    closing: 'If you cannot take part, write to the office.',
  }
}
