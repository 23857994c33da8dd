/** Who writes invoices, and where they are paid to. */
export interface BillingFacts {
  name: string
  /** Lines as typed. */
  address: string
  /** Empty where there is none. */
  taxNumber: string
  /** E-mail address for questions. */
  contact: string
  accountHolder: string
  /** ISO 13616, capitals, without spaces. */
  iban: string
  /** ISO 9362: eight or eleven characters. */
  bic: string
  bank: string
}

/** A version of it, which is never changed: a paper keeps what it said. */
export interface BillingRecord {
  id: number
  recordVersion: number
  savedAt: Date
  savedBy: string | null
  facts: BillingFacts
}
