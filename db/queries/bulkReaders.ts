import type { Database } from '../client.ts'
import type { OutboxRow } from '../tables.ts'

export interface BulkReader {
  personId: number
  name: string
  email: string
  state: OutboxRow['state']
}

/** Who a letter to many was given to the outbox for, by name, and how each stands. */
export async function bulkReaders(db: Database, bulkLetterId: number): Promise<BulkReader[]> {
  const rows = await db('outbox')
    .where({ bulk_letter_id: bulkLetterId })
    .orderBy(['to_name', 'id'])
    .select('person_id', 'to_name', 'to_email', 'state')
  return rows.map((row) => ({
    personId: row.person_id ?? 0,
    name: row.to_name,
    email: row.to_email,
    state: row.state,
  }))
}

/** The letter as it was written to one of many; null when it was not. */
export async function bulkLetterTo(
  db: Database,
  bulkLetterId: number,
  personId: number,
): Promise<{ subject: string; text: string; html: string } | null> {
  const row = await db('outbox')
    .where({ bulk_letter_id: bulkLetterId, person_id: personId })
    .first({ subject: 'subject', text: 'text_body', html: 'html_body' })
  return row ?? null
}
