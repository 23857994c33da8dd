import type { ObjectStore } from '../../lib/services/storage/ObjectStore.ts'
import type { Database } from '../client.ts'
import { seedBilling } from './billing.ts'
import { seedCalls } from './calls.ts'
import { seedFacility } from './facility.ts'
import { seedPeople } from './people.ts'
import { seedRoles } from './roles.ts'
import { pastPayments, type PastPayment } from './story/pastPayments.ts'
import { tellStory } from './story/tellStory.ts'

export interface SeedServices {
  storage: ObjectStore
  origin: string
  /** Tells the payment mock of the demonstration's past, so that its list and ours agree. */
  recordPast: (payments: readonly PastPayment[]) => Promise<void>
}

/** Seeds the demonstration once, all of it or nothing; true when it did, false when it was there already. */
export async function seedDemo(db: Database, anchor: Date, services: SeedServices): Promise<boolean> {
  if (await db('people').where({ is_demo: 1 }).first('id')) return false
  await db.transaction(async (trx) => {
    const facility = await seedFacility(trx)
    const people = await seedPeople(trx)
    await seedBilling(trx)
    const calls = await seedCalls(trx, facility, anchor)
    await seedRoles(trx, people, facility.instrumentIds, Object.values(calls))
    const payments = pastPayments()
    await tellStory(trx, { people, facility, calls, anchor }, { ...services, payments })
    await services.recordPast(payments.made())
  })
  return true
}
