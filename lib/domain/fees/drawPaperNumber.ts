import { databaseNow } from '@/db/queries/clock'
import { drawNumber } from '@/db/queries/receipts'
import type { Context } from '../context'
import { paperNumber, type PaperSeries } from './paperNumber'

/** The next number of a series in this year, drawn in the caller's transaction so that none is left out. */
export async function drawPaperNumber(tx: Context, series: PaperSeries): Promise<string> {
  const year = (await databaseNow(tx.db)).getUTCFullYear()
  return paperNumber(series, year, await drawNumber(tx.db, `${series}-${year}`))
}
