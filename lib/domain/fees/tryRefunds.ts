import type { Context } from '../context'
import { carryOutRefunds } from './carryOutRefunds'

/**
 * What was decided stands and is on record, so nothing that fails here may fail the request. The job tries again
 * within a minute, and writes to the log what it meets.
 */
export async function tryRefunds(ctx: Context): Promise<void> {
  await carryOutRefunds(ctx).catch(() => undefined)
}
