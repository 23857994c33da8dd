import { databaseNow } from '@/db/queries/clock'
import { Refusal } from '@/lib/errors'
import type { Context } from '../context'
import { newObjectKey } from '../objects/objectKey'
import { storedBytes } from '../papers/storedBytes'
import type { Paper } from '../proposals/writingTypes'

export interface CopiedFile<File> {
  file: File
  /** Where the copy lies. */
  key: string
}

/**
 * Copies documents and pictures under keys of their own, so that no two proposals share an object. One that the store
 * does not give is left out: the new proposal then asks for it. Put before any row is written, as on uploading.
 */
export async function copyFiles<File extends Pick<Paper, 'objectKey' | 'sha256'>>(
  ctx: Context,
  files: readonly File[],
  contentTypeOf: (file: File) => string,
): Promise<CopiedFile<File>[]> {
  const copied: CopiedFile<File>[] = []
  for (const file of files) {
    try {
      const bytes = await storedBytes(ctx, file)
      const key = newObjectKey(ctx.random, await databaseNow(ctx.db))
      await ctx.storage.put(key, bytes, contentTypeOf(file))
      copied.push({ file, key })
    } catch (error) {
      if (!(error instanceof Refusal)) throw error
    }
  }
  return copied
}
