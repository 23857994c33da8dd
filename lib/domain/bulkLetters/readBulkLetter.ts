import type { Recipient } from '@/db/queries/recipients'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { renderLetter } from '../outbox/renderLetter'
import { composeLetter } from './composeLetter'
import { findRecipients } from './findRecipients'
import { openBulkLetter, type OpenedBulkLetter } from './openBulkLetter'
import { mayWriteToMany } from './policy'

export interface BulkLetterRead {
  letter: OpenedBulkLetter
  /** Who it is for now. */
  readers: Recipient[]
  /** The letter as one of them gets it; null where it is for nobody. */
  shown: { reader: Recipient; subject: string; text: string; html: string } | null
}

/** A letter to many with those it is for, and as one of them gets it: the one asked for, or the first. */
export async function readBulkLetter(
  ctx: ActingContext,
  id: number,
  personId: number | null,
): Promise<BulkLetterRead> {
  authorize(mayWriteToMany(ctx.actor))
  const letter = await openBulkLetter(ctx.db, id)
  const readers = await findRecipients(ctx.db, letter.audience)
  const reader = readers.find((one) => one.personId === personId) ?? readers[0]
  if (!reader) return { letter, readers, shown: null }
  const composed = composeLetter(letter, reader, letter.call)
  return { letter, readers, shown: { reader, subject: composed.subject, ...renderLetter(composed) } }
}
