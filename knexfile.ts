import { fileURLToPath } from 'node:url'
import type { Knex } from 'knex'

// The migrating user may alter tables; the application's own user may not.
const url = process.env.MIGRATION_DATABASE_URL ?? process.env.DATABASE_URL

const config: Knex.Config = {
  client: 'mysql2',
  connection: url ?? '',
  migrations: {
    directory: fileURLToPath(new URL('./db/migrations', import.meta.url)),
    loadExtensions: ['.ts'],
    tableName: 'migrations',
  },
}

export default config
