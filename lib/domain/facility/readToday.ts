import { databaseNow } from '@/db/queries/clock'
import type { Context } from '../context'

/** Today in UTC by the database's clock, `YYYY-MM-DD`. */
export const readToday = async (ctx: Context): Promise<string> =>
  (await databaseNow(ctx.db)).toISOString().slice(0, 10)
