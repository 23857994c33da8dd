import type { Database } from '@/db/client'
import { clashesOfMerge } from '@/db/queries/merge'
import type { findPerson } from '@/db/queries/people'
import { clashWords } from './mergeWords'

type Person = NonNullable<Awaited<ReturnType<typeof findPerson>>>

/** Everything that speaks against making one account of two, a sentence each; empty when nothing does. */
export async function whyNotMerge(
  db: Database,
  keep: Person,
  gone: Person,
  actorId: number,
): Promise<string[]> {
  if (keep.id === gone.id) return ['These are one account already.']
  if (gone.id === actorId) return ['You cannot merge away the account you are using.']
  if (gone.merged_into_id !== null || gone.erased_at) return [`${gone.email} was merged or erased already.`]
  if (keep.merged_into_id !== null || keep.erased_at) return ['The account to keep was merged or erased.']
  if (keep.disabled_at) return ['The account to keep is shut. Open it again first.']
  return clashWords(await clashesOfMerge(db, keep, gone))
}
