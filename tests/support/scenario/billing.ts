import type { Database } from '@/db/client'
import { billingRecord, insertBillingRecord } from '@/db/queries/billing'
import type { BillingFacts } from '@/lib/domain/billing/types'

export const scenarioBilling: BillingFacts = {
  name: 'Office of the test',
  address: '1 Ridge Road\nQuillon',
  taxNumber: 'QZ 1',
  contact: 'office@noctuary.example',
  accountHolder: 'Observatory of the test',
  iban: 'QZ69447011820093000012',
  bic: 'QRBKQZ2X',
  bank: 'Bank of the test',
}

/** Who writes invoices, where nobody does yet. */
export async function makeBilling(db: Database): Promise<void> {
  if (!(await billingRecord(db))) await insertBillingRecord(db, 1, scenarioBilling, null)
}
