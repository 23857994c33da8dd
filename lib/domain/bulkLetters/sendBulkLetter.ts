import { takeBulkLetter } from '@/db/queries/bulkLetters'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { countInWords } from '@/lib/format'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { queueLetter } from '../outbox/queueLetter'
import { composeLetter } from './composeLetter'
import { findRecipients } from './findRecipients'
import { openBulkLetter } from './openBulkLetter'
import { mayWriteToMany } from './policy'

/**
 * Gives a letter to the outbox for everyone it is for, in one transaction, each once. It is refused when the number
 * of people is not the one that was shown: whoever sends has then not seen to whom. Returns how many letters.
 */
export async function sendBulkLetter(
  ctx: ActingContext,
  input: { id: number; version: number; expected: number },
): Promise<{ letters: number }> {
  authorize(mayWriteToMany(ctx.actor))
  return inTransaction(ctx, async (tx) => {
    const letter = await openBulkLetter(tx.db, input.id)
    if (letter.queuedAt) throw refuse.closed('This letter has been sent already.')
    const readers = (await findRecipients(tx.db, letter.audience)).filter((one) => !one.addressFails)
    if (readers.length !== input.expected)
      throw refuse.closed(
        `The letter is for ${countInWords(readers.length, 'person', 'people')} now, not ${input.expected}. Load the page and look again.`,
      )
    if (!(await takeBulkLetter(tx.db, letter.id, input.version, readers.length)))
      throw refuse.closed('This letter was changed or sent in between. Load the page again.')
    for (const reader of readers)
      await queueLetter(
        tx,
        { personId: reader.personId, email: reader.email, name: reader.name },
        composeLetter(letter, reader, letter.call),
        `bulk:${letter.id}`,
        letter.id,
      )
    await writeLogbook(tx, {
      action: 'bulk-letter.send',
      subject: { kind: 'bulk letter', id: letter.id },
      actingAs: 'office',
      after: { letters: readers.length, ...letter.audience },
    })
    return { letters: readers.length }
  })
}
