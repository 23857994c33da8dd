import type { Database } from '@/db/client'
import { bulkLetterTo, bulkReaders } from '@/db/queries/bulkReaders'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { renderLetter } from '../outbox/renderLetter'
import type { LetterRow } from '../outbox/schema'
import { composeLetter } from './composeLetter'
import { findRecipients } from './findRecipients'
import { openBulkLetter, type OpenedBulkLetter } from './openBulkLetter'
import { mayWriteToMany } from './policy'

interface Reader {
  personId: number
  name: string
  email: string
  /** Left out: letters do not reach the address. */
  addressFails: boolean
  /** How the letter stands; null while it is a draft. */
  state: LetterRow['state'] | null
}

export interface BulkLetterRead {
  letter: OpenedBulkLetter
  /** Who it is for now; once sent, who it went to the outbox for. */
  readers: Reader[]
  /** The letter as one of them gets it; null where it is for nobody. */
  shown: { reader: Reader; subject: string; text: string; html: string } | null
}

type Parts = Omit<BulkLetterRead, 'letter'>

async function asDraft(db: Database, letter: OpenedBulkLetter, personId: number | null): Promise<Parts> {
  const found = await findRecipients(db, letter.audience)
  const readers = found.map(({ name, email, addressFails, ...one }) => ({
    personId: one.personId,
    name,
    email,
    addressFails,
    state: null,
  }))
  const at = Math.max(
    0,
    found.findIndex((one) => one.personId === personId),
  )
  const [recipient, reader] = [found[at], readers[at]]
  if (!recipient || !reader) return { readers, shown: null }
  const composed = composeLetter(letter, recipient, letter.call)
  return { readers, shown: { reader, subject: composed.subject, ...renderLetter(composed) } }
}

async function asSent(db: Database, id: number, personId: number | null): Promise<Parts> {
  const readers = (await bulkReaders(db, id)).map((one) => ({ ...one, addressFails: false }))
  const reader = readers.find((one) => one.personId === personId) ?? readers[0]
  const written = reader ? await bulkLetterTo(db, id, reader.personId) : null
  return { readers, shown: reader && written ? { reader, ...written } : null }
}

/**
 * A letter to many with those it is for, and as one of them gets it: the one asked for, or the first. Once it was
 * given to the outbox, it is read from there: as it went, to whom it went.
 */
export async function readBulkLetter(
  ctx: ActingContext,
  id: number,
  personId: number | null,
): Promise<BulkLetterRead> {
  authorize(mayWriteToMany(ctx.actor))
  const letter = await openBulkLetter(ctx.db, id)
  const parts = letter.queuedAt ? await asSent(ctx.db, id, personId) : await asDraft(ctx.db, letter, personId)
  return { letter, ...parts }
}
