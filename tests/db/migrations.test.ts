import { readdirSync } from 'node:fs'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { connect, type Database } from '@/db/client'
import { migrationSettings as settings, steps } from '../support/migrationSource'

// Seen to fail: a `down` that dropped too little, and a table without a comment.

const address = new URL(process.env.DATABASE_URL ?? '')
const name = `noctuary_migrations_${process.pid}`
let server: Database
let db: Database

async function tables(): Promise<Record<string, string>> {
  const [rows] = (await db.raw('SHOW TABLES')) as [Record<string, string>[]]
  const shown: Record<string, string> = {}
  for (const table of rows.map((row) => Object.values(row)[0] as string)) {
    if (table.startsWith('migrations')) continue
    const [[create]] = (await db.raw('SHOW CREATE TABLE ??', [table])) as [Record<string, string>[]]
    shown[table] = create?.['Create Table'] ?? ''
  }
  return shown
}

describe('the migrations', () => {
  beforeAll(async () => {
    server = connect(address.toString())
    await server.raw('DROP DATABASE IF EXISTS ??', [name])
    await server.raw('CREATE DATABASE ??', [name])
    const own = new URL(address)
    own.pathname = `/${name}`
    db = connect(own.toString())
  })
  afterAll(async () => {
    await db.destroy()
    await server.raw('DROP DATABASE IF EXISTS ??', [name])
    await server.destroy()
  })

  it('go up, down to nothing, and up to the same', async () => {
    await db.migrate.latest(settings)
    const first = await tables()
    expect(Object.keys(first).length).toBeGreaterThan(55)
    await db.migrate.rollback(settings, true)
    expect(await tables()).toEqual({})
    await db.migrate.latest(settings)
    expect(await tables()).toEqual(first)
  }, 180_000)

  it('say of every table and column what it is, in utf8mb4', async () => {
    const [bare] = (await db.raw(
      `SELECT TABLE_NAME, COLUMN_NAME FROM information_schema.COLUMNS
        WHERE TABLE_SCHEMA = DATABASE() AND COLUMN_COMMENT = '' AND TABLE_NAME NOT LIKE 'migrations%'`,
    )) as [unknown[]]
    expect(bare).toEqual([])
    const [untold] = (await db.raw(
      `SELECT TABLE_NAME FROM information_schema.TABLES WHERE TABLE_SCHEMA = DATABASE()
          AND TABLE_NAME NOT LIKE 'migrations%' AND (TABLE_COMMENT = '' OR TABLE_COLLATION <> 'utf8mb4_unicode_ci')`,
    )) as [unknown[]]
    expect(untold).toEqual([])
  })

  it('are all found by the command that runs them', () => {
    expect(readdirSync('db/migrations').length).toBe(steps.length)
  })

  it('refuse to change what is a record of the past', async () => {
    await db('logbook').insert({
      at: new Date(),
      acting_as: 'clock',
      action: 'test',
      subject_kind: 'test',
      subject_id: '1',
      request_id: 'test',
      previous_hash: '0'.repeat(64),
      hash: 'f'.repeat(64),
    })
    await expect(db('logbook').update({ action: 'other' })).rejects.toThrow('append-only')
    await expect(db('logbook').delete()).rejects.toThrow('append-only')
  })
})
