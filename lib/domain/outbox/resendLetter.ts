import { randomBytes } from 'node:crypto'
import { findLetter, insertLetter, timesRepeated } from '@/db/queries/outbox'
import { findPerson } from '@/db/queries/people'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { mayReadOutbox } from './policy'
import { whyNotAgain } from './rules'

/** Writes a sent letter once more, word for word, to the address its account has now. Returns that address. */
export async function resendLetter(ctx: ActingContext, input: { letterId: number }): Promise<{ to: string }> {
  authorize(mayReadOutbox(ctx.actor))
  return inTransaction(ctx, async (tx) => {
    const letter = await findLetter(tx.db, input.letterId)
    if (!letter) throw refuse.notFound('letter')
    const why = whyNotAgain(letter)
    if (why) throw refuse.closed(why)
    const person = letter.person_id === null ? null : await findPerson(tx.db, letter.person_id)
    if (person?.erased_at) throw refuse.closed('This person was erased: there is nobody to write to.')
    const times = await timesRepeated(tx.db, letter.id)
    const to = person?.email ?? letter.to_email
    await insertLetter(tx.db, {
      dedupeKey: `again:${letter.id}:${times + 1}`,
      messageId: `<${randomBytes(16).toString('hex')}@${new URL(tx.request.origin).hostname}>`,
      template: letter.template,
      personId: letter.person_id,
      toEmail: to,
      toName: letter.to_name,
      subject: letter.subject,
      text: letter.text_body,
      html: letter.html_body,
      attachment: letter.attachment,
      againOf: letter.id,
    })
    await writeLogbook(tx, {
      action: 'letter.again',
      subject: { kind: 'letter', id: letter.id },
      actingAs: 'office',
      after: { to, times: times + 1 },
    })
    return { to }
  })
}
