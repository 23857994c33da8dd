import { readLogbookPage } from '@/db/queries/logbook'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { entryHash } from './entryHash'
import { mayReadLogbook } from './policy'

export interface ChainReport {
  rows: number
  /** Id of the first row whose hash does not follow from what it says; null when the chain is whole. */
  brokenAt: number | null
}

/** Goes through the whole logbook and computes every hash anew. */
export async function checkChain(ctx: ActingContext): Promise<ChainReport> {
  authorize(mayReadLogbook(ctx.actor))
  let previous = '0'.repeat(64)
  let after = 0
  let rows = 0
  for (;;) {
    const page = await readLogbookPage(ctx.db, after, 1000)
    if (page.length === 0) return { rows, brokenAt: null }
    for (const row of page) {
      if (row.previous_hash !== previous || entryHash(row, previous) !== row.hash)
        return { rows, brokenAt: row.id }
      previous = row.hash
      after = row.id
      rows += 1
    }
  }
}
