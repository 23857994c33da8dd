import { findLetter } from '@/db/queries/outbox'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { letterLine } from './letterLine'
import type { LetterView } from './letterView'
import { mayReadOutbox } from './policy'
import { whyNotAgain } from './rules'
import { withoutSecrets } from './withoutSecrets'

/** One letter of the outbox: how it stands, and its words. */
export async function readLetter(
  ctx: ActingContext,
  letterId: number,
): Promise<{ letter: LetterView; html: string }> {
  authorize(mayReadOutbox(ctx.actor))
  const row = await findLetter(ctx.db, letterId)
  if (!row) throw refuse.notFound('letter')
  const letter = {
    ...letterLine(row),
    text: withoutSecrets(row.text_body),
    messageId: row.message_id,
    personId: row.person_id,
    againOf: row.again_of,
    whyNotAgain: whyNotAgain(row),
  }
  return { letter, html: withoutSecrets(row.html_body) }
}
