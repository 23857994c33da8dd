import { log } from '@/lib/log'
import type { Context } from '../context'
import { carryOutRefunds } from './carryOutRefunds'

/** What was decided stands and is on record: what fails now is done by the job. */
export async function tryRefunds(ctx: Context): Promise<void> {
  try {
    await carryOutRefunds(ctx)
  } catch (error) {
    log.warn({ requestId: ctx.request.id, error }, 'a refund waits for the job')
  }
}
