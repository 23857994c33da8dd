import type { Database } from '../client.ts'
import { seedCalls } from './calls.ts'
import { seedFacility } from './facility.ts'
import { seedPeople } from './people.ts'
import { seedRoles } from './roles.ts'

/** Seeds the demonstration once; true when it did, false when it was there already. */
export async function seedDemo(db: Database, anchor: Date): Promise<boolean> {
  if (await db('people').where({ is_demo: 1 }).first('id')) return false
  await db.transaction(async (trx) => {
    const facility = await seedFacility(trx)
    const people = await seedPeople(trx)
    const calls = await seedCalls(trx, facility, anchor)
    await seedRoles(trx, people, facility.instrumentIds, Object.values(calls))
  })
  return true
}
