import { randomBytes } from 'node:crypto'
import { insertLetter } from '@/db/queries/outbox'
import type { Context } from '../context'
import type { Letter } from './letter'
import { renderLetter } from './renderLetter'
import { isForgottenOnceSent } from './rules'

export interface Addressee {
  personId: number | null
  email: string
  name: string
}

/** Writes a letter in the caller's transaction; the relay sends it once the transaction stands. */
export async function queueLetter(
  tx: Context,
  to: Addressee,
  letter: Letter,
  /** What caused it, e.g. 'submitted:412:1'; the same cause never writes twice to one address. */
  cause: string,
  bulkLetterId?: number,
): Promise<void> {
  const { text, html } = renderLetter(letter)
  const domain = new URL(tx.request.origin).hostname
  await insertLetter(tx.db, {
    // Written once by its cause alone, so that no address is left in the key.
    dedupeKey: (isForgottenOnceSent(letter.template) ? cause : `${cause}:${to.email.toLowerCase()}`).slice(
      0,
      120,
    ),
    messageId: `<${randomBytes(16).toString('hex')}@${domain}>`,
    template: letter.template,
    personId: to.personId,
    toEmail: to.email,
    toName: to.name,
    subject: letter.subject.replace(/[\r\n]+/g, ' '),
    text,
    html,
    attachment: letter.attachment ?? null,
    ...(bulkLetterId === undefined ? {} : { bulkLetterId }),
  })
}
