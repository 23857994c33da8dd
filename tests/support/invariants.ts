import { expect } from 'vitest'
import type { Database } from '@/db/client'
import { invariantBreaches } from '@/db/queries/invariants'

/** Fails with the name of each promise that does not hold. */
export async function checkInvariants(db: Database): Promise<void> {
  expect(await invariantBreaches(db)).toEqual([])
}
