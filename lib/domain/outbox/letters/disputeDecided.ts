import { formatMoney, formatUtcWithYear } from '@/lib/format'
import type { Letter } from '../letter'

const subjects = {
  'ask-again': 'the fee is owed again',
  waive: 'the fee is waived',
  withdraw: 'the proposal has been withdrawn',
} as const

/** To those who lead, and to all where the proposal goes: what the office makes of a payment the bank took back. */
export function disputeDecided(facts: {
  name: string
  reference: string
  title: string
  amountMinor: number
  currency: string
  decision: keyof typeof subjects
  note: string
  dueAt: Date
  url: string
}): Letter {
  const amount = formatMoney(facts.amountMinor, facts.currency)
  const then = {
    'ask-again': `The fee of ${amount} is owed again. Pay by card, have it invoiced to an institute, or ask for a waiver by ${formatUtcWithYear(facts.dueAt)}; what is not settled by then lapses, and the proposal leaves the call.`,
    waive: `The office waives the fee of ${amount}: nothing is owed, and the proposal stays in.`,
    withdraw: `The office has withdrawn the proposal. Nothing is owed for it, and nobody will decide on it.`,
  } as const
  return {
    template: 'dispute-decided',
    subject: `${facts.reference}: ${subjects[facts.decision]}`,
    greeting: `Dear ${facts.name},`,
    paragraphs: [
      `The holder of the card disputed the payment for “${facts.title}”, and the bank has taken it back.`,
      then[facts.decision],
      `The office writes: ${facts.note}`,
    ],
    action: {
      label: facts.decision === 'ask-again' ? 'Settle the fee' : 'See the proposal',
      url: facts.url,
    },
  }
}
