import type { Knex } from 'knex'
import { afterAll, afterEach, beforeEach } from 'vitest'
import { connect, type Database } from '@/db/client'
import { checkInvariants } from './invariants'

let pool: Database | null = null
let current: Knex.Transaction | null = null

function url(): string {
  const given = process.env.DATABASE_URL
  if (!given)
    throw new Error('DATABASE_URL is not set: run `npm test`, or `npm run services` and load its env.json.')
  return given
}

/** The pool of this test file. */
export function pooled(): Database {
  pool ??= connect(url(), { max: 12 })
  return pool
}

/**
 * Each test of the file runs in a transaction that is rolled back; what trust promises is checked before that,
 * whatever the test did. Returns how to reach the transaction.
 */
export function useRolledBackDatabase(): () => Database {
  beforeEach(async () => {
    current = await pooled().transaction()
  })
  afterEach(async () => {
    const ended = current
    current = null
    try {
      if (ended) await checkInvariants(ended)
    } finally {
      await ended?.rollback()
    }
  })
  afterAll(async () => {
    await pool?.destroy()
    pool = null
  })
  return () => {
    if (!current) throw new Error('no test is running')
    return current
  }
}
