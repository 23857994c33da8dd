import type { Knex } from 'knex'
import { createdAt, exactText } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('stored_objects', (t) => {
    t.comment('Every object in the store has a row, and every row an object')
    t.increments('id').comment('key')
    exactText(t, 'object_key', 120, 'key in the store, made by us').notNullable().unique()
    exactText(t, 'sha256', 64, 'SHA-256 of the bytes, hex; checked on every read').notNullable()
    t.integer('size_bytes').unsigned().notNullable().comment('length')
    t.string('content_type', 80).notNullable().comment('media type')
    t.enum('purpose', ['paper', 'packet', 'receipt', 'record']).notNullable().comment('what it is')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('stored_objects')
}
