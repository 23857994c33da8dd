import { formatAccount } from '@/lib/format'
import type { BillingFacts } from './types'

/** Where an invoice is paid to, on one line: `Quillon Ridge Observatory, IBAN …, BIC …, Bank of …`. */
export const payTo = ({ accountHolder, iban, bic, bank }: BillingFacts): string =>
  `${accountHolder}, IBAN ${formatAccount(iban)}, BIC ${bic}, ${bank}`
