import './loadEnvironment'
import { afterEach } from 'vitest'
import { checkInvariants } from './invariants'
import { openTransaction } from './database'

// What trust promises holds after every test, whatever the test did.
afterEach(async () => {
  const trx = openTransaction()
  if (trx) await checkInvariants(trx)
})
