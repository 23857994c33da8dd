import { listBulkLetters, type BulkLetterLine } from '@/db/queries/bulkLetters'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { mayWriteToMany } from './policy'

/** Letters to many, drafts among them, the newest first. */
export async function readBulkLetters(ctx: ActingContext): Promise<BulkLetterLine[]> {
  authorize(mayWriteToMany(ctx.actor))
  return listBulkLetters(ctx.db, 500)
}
