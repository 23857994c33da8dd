import { hasDemoPeople } from '@/db/queries/people'
import { demoAccounts, type DemoAccount } from '@/db/seeds/accounts'
import type { Context } from '../context'

/** The demonstration's accounts, where the demonstration has been seeded. */
export async function readDemoAccounts(ctx: Context): Promise<readonly DemoAccount[]> {
  return (await hasDemoPeople(ctx.db)) ? demoAccounts : []
}
