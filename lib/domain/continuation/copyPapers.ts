import { databaseNow } from '@/db/queries/clock'
import { Refusal } from '@/lib/errors'
import type { Context } from '../context'
import { newObjectKey } from '../objects/objectKey'
import { storedBytes } from '../papers/storedBytes'
import type { Paper } from '../proposals/writingTypes'

export interface CopiedPaper {
  paper: Paper
  /** Where the copy lies. */
  key: string
}

/**
 * Copies documents under keys of their own, so that no two proposals share an object. One that the store does not give
 * is left out: the new proposal then asks for it. Put before any row is written, as on uploading.
 */
export async function copyPapers(ctx: Context, papers: readonly Paper[]): Promise<CopiedPaper[]> {
  const copied: CopiedPaper[] = []
  for (const paper of papers) {
    try {
      const bytes = await storedBytes(ctx, paper)
      const key = newObjectKey(ctx.random, await databaseNow(ctx.db))
      await ctx.storage.put(key, bytes, 'application/pdf')
      copied.push({ paper, key })
    } catch (error) {
      if (!(error instanceof Refusal)) throw error
    }
  }
  return copied
}
