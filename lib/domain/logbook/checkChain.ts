import type { Database } from '@/db/client'
import { logbookHead, readLogbookPage } from '@/db/queries/logbook'
import { insertCheck } from '@/db/queries/logbookChecks'
import { entryHash } from './entryHash'

export interface ChainReport {
  /** Rows that follow from the one before. */
  rows: number
  /** What does not follow, in words; null when the chain is whole. */
  fault: string | null
}

const pageRows = 1000

async function walk(db: Database): Promise<ChainReport> {
  let previous = '0'.repeat(64)
  let after = 0
  let rows = 0
  for (;;) {
    const page = await readLogbookPage(db, after, pageRows)
    for (const row of page) {
      if (row.previous_hash !== previous) return { rows, fault: `a row is missing before row ${row.id}` }
      if (entryHash(row, previous) !== row.hash)
        return { rows, fault: `row ${row.id} does not say what it said when it was written` }
      previous = row.hash
      after = row.id
      rows += 1
    }
    if (page.length < pageRows) break
  }
  const head = await logbookHead(db)
  return { rows, fault: head === previous ? null : `rows are missing after row ${after}` }
}

/**
 * Goes through the whole logbook, computes every hash anew, compares the last with the kept end of the chain, and
 * keeps what it found. `checkedBy` is who asked, null for the clock.
 */
export async function checkChain(db: Database, checkedBy: number | null): Promise<ChainReport> {
  // One snapshot for all pages and the head: what is written meanwhile belongs to the next check.
  const report = await db.transaction(walk)
  await insertCheck(db, { checkedBy, rowsChecked: report.rows, fault: report.fault })
  return report
}
