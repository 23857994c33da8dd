import { listLetters } from '@/db/queries/outbox'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { letterLine } from './letterLine'
import { mayReadOutbox } from './policy'
import type { LettersReply } from './schema'

const most = 1000

/** The last thousand letters with their state. */
export async function readLetters(ctx: ActingContext): Promise<LettersReply> {
  authorize(mayReadOutbox(ctx.actor))
  return { rows: (await listLetters(ctx.db, most)).map(letterLine) }
}
