import type { BillingFacts } from '@/lib/domain/billing/types'

/** Names of the fields, in the form and where two versions are compared. */
export const billingLabels: Readonly<Record<keyof BillingFacts, string>> = {
  name: 'Name',
  address: 'Postal address',
  taxNumber: 'Tax number',
  contact: 'Questions go to',
  accountHolder: 'Holder of the account',
  iban: 'IBAN',
  bic: 'BIC',
  bank: 'Bank',
}
