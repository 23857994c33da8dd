import type { Database } from '../client.ts'

/** Frees the names of targets that are about to be called otherwise, so that two may change names with each other. */
export async function freeNames(db: Database, ids: readonly number[]): Promise<void> {
  for (const id of ids)
    await db('targets')
      .where({ id })
      .update({ name: `\u0000${id}` })
}
