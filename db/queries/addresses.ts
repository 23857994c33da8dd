import type { Database } from '../client.ts'
import { utcNow } from '../utcNow.ts'

/** A mail server refused an address for good: whoever has it is marked. */
export async function addressFailed(db: Database, email: string, said: string): Promise<void> {
  await db('people')
    .where({ email })
    .update({ address_failed_at: utcNow(db), address_failed_why: said.slice(0, 300) })
}

/** A letter was taken: the mark goes. */
export async function addressWorks(db: Database, email: string): Promise<void> {
  await db('people')
    .where({ email })
    .whereNotNull('address_failed_at')
    .update({ address_failed_at: null, address_failed_why: null })
}
