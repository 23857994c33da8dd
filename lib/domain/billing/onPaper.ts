import { formatAccount } from '@/lib/format'
import type { BillingFacts } from './types'

/** The account as rows of an invoice, with what the payment must name. */
export const accountRows = (facts: BillingFacts, number: string): { term: string; value: string }[] => [
  { term: 'Holder', value: facts.accountHolder },
  { term: 'IBAN', value: formatAccount(facts.iban) },
  { term: 'BIC', value: facts.bic },
  { term: 'Bank', value: facts.bank },
  { term: 'To be named', value: number },
]

/** Who wrote a paper, at its foot. */
export function issuerWords(facts: BillingFacts | null): string[] {
  if (!facts) return []
  const address = facts.address.split('\n').join(', ')
  const tax = facts.taxNumber ? ` Tax number ${facts.taxNumber}.` : ''
  return [`${facts.name}, ${address}.${tax}`, `Questions: ${facts.contact}.`]
}
