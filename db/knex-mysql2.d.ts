// Knex ships no types for its dialects; this is the part that db/client.ts overrides.
declare module 'knex/lib/dialects/mysql2/index.js' {
  import { type Knex } from 'knex'
  export default class MysqlClient extends Knex.Client {
    _query(connection: unknown, statement: { sql: string }): Promise<unknown>
  }
}
