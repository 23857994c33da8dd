import type { Database } from '../client.ts'
import { insertBillingRecord } from '../queries/billing.ts'

/** An account of the demonstration: its country is one of the codes ISO 3166 never gives to any. */
export async function seedBilling(db: Database): Promise<void> {
  await insertBillingRecord(
    db,
    1,
    {
      name: 'Quillon Ridge Observatory, time-allocation office',
      address: '1 Ridge Road\nQuillon',
      taxNumber: 'QZ 4470 118 200',
      contact: 'office@quillonridge.example',
      accountHolder: 'Quillon Ridge Observatory',
      iban: 'QZ69447011820093000012',
      bic: 'QRBKQZ2X',
      bank: 'Ridge Savings Bank (demonstration: no such bank)',
    },
    null,
  )
}
