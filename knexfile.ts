import type { Knex } from 'knex'
import { migrationSettings } from './db/client.ts'

// The migrating user may alter tables; the application's own user may not.
const url = process.env.MIGRATION_DATABASE_URL ?? process.env.DATABASE_URL

const config: Knex.Config = {
  client: 'mysql2',
  connection: url ?? '',
  migrations: migrationSettings,
}

export default config
