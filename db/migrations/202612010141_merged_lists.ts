import type { Knex } from 'knex'
import { createdAt, instant, reference, version } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('merged_lists', (t) => {
    t.comment('Lists of all panels of a call brought together; frozen ones stay')
    t.increments('id').comment('key')
    reference(t, 'call_id', 'calls', 'RESTRICT', 'which call').notNullable()
    t.integer('list_version').unsigned().notNullable().comment('counts from 1')
    instant(t, 'frozen_at', 'when it was frozen')
    reference(t, 'made_by', 'people', 'SET NULL', 'who')
    instant(t, 'superseded_at', 'when a newer one took its place')
    version(t)
    createdAt(t)
    t.unique(['call_id', 'list_version'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('merged_lists')
}
