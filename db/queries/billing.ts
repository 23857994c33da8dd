import type { BillingFacts, BillingRecord } from '../../lib/domain/billing/types.ts'
import type { Database } from '../client.ts'
import type { BillingRecordsRow } from '../tables.ts'

const recordOf = (row: BillingRecordsRow & { writer: string | null }): BillingRecord => ({
  id: row.id,
  recordVersion: row.record_version,
  savedAt: row.created_at,
  savedBy: row.writer,
  facts: {
    name: row.name,
    address: row.address,
    taxNumber: row.tax_number,
    contact: row.contact,
    accountHolder: row.account_holder,
    iban: row.iban,
    bic: row.bic,
    bank: row.bank,
  },
})

const records = (db: Database) =>
  db('billing_records as b').leftJoin('people as p', 'p.id', 'b.saved_by').select('b.*', 'p.name as writer')

type Found = (BillingRecordsRow & { writer: string | null })[]

/** Every version, the newest first: that one holds. */
export async function billingRecords(db: Database): Promise<BillingRecord[]> {
  return ((await records(db).orderBy('b.record_version', 'desc')) as unknown as Found).map(recordOf)
}

/** The version that holds; null before the office has given one. */
export async function billingRecord(db: Database): Promise<BillingRecord | null> {
  const rows = (await records(db).orderBy('b.record_version', 'desc').limit(1)) as unknown as Found
  return rows[0] ? recordOf(rows[0]) : null
}

/** The version a paper was written under. What was written before versions were kept has the first of them. */
export async function billingRecordOf(db: Database, id: number | null): Promise<BillingRecord | null> {
  const asked = id === null ? records(db) : records(db).where('b.id', id)
  const rows = (await asked.orderBy('b.record_version').limit(1)) as unknown as Found
  return rows[0] ? recordOf(rows[0]) : null
}

/** Locks the version that holds and gives its number; 0 where there is none. */
export async function lockBillingVersion(db: Database): Promise<number> {
  const row = await db('billing_records')
    .orderBy('record_version', 'desc')
    .forUpdate()
    .first('record_version')
  return row?.record_version ?? 0
}

export async function insertBillingRecord(
  db: Database,
  recordVersion: number,
  facts: BillingFacts,
  savedBy: number | null,
): Promise<number> {
  const [id] = await db('billing_records').insert({
    record_version: recordVersion,
    name: facts.name,
    address: facts.address,
    tax_number: facts.taxNumber,
    contact: facts.contact,
    account_holder: facts.accountHolder,
    iban: facts.iban,
    bic: facts.bic,
    bank: facts.bank,
    saved_by: savedBy,
  })
  return Number(id)
}
