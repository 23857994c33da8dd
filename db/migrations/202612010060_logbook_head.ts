import type { Knex } from 'knex'
import { exactText } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('logbook_head', (t) => {
    t.comment('The last hash of the chain, locked while a row is added')
    t.integer('id').unsigned().notNullable().primary().comment('always 1')
    exactText(t, 'last_hash', 64, 'hash of the last row').notNullable()
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('logbook_head')
}
