import { afterAll, afterEach, beforeAll } from 'vitest'
import { connect, type Database } from '@/db/client'
import { checkInvariants } from './invariants'
import { migrationSettings } from './migrationSource'

/**
 * A database of the test file's own, migrated and dropped at the end: for what needs transactions that really
 * commit. Its invariants are checked after every test. Returns how to reach it.
 */
export function useOwnDatabase(purpose: string, pool: { max?: number } = {}): () => Database {
  const address = new URL(process.env.DATABASE_URL ?? '')
  const name = `noctuary_${purpose}_${process.pid}`
  let server: Database
  let db: Database | null = null

  beforeAll(async () => {
    server = connect(address.toString())
    await server.raw('DROP DATABASE IF EXISTS ??', [name])
    await server.raw('CREATE DATABASE ??', [name])
    const own = new URL(address)
    own.pathname = `/${name}`
    db = connect(own.toString(), pool)
    await db.migrate.latest(migrationSettings)
  })
  afterEach(() => checkInvariants(reach()))
  afterAll(async () => {
    await db?.destroy()
    await server.raw('DROP DATABASE IF EXISTS ??', [name])
    await server.destroy()
  })

  const reach = () => {
    if (!db) throw new Error('the database of this file is not made yet')
    return db
  }
  return reach
}
