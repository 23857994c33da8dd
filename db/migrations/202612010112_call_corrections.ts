import type { Knex } from 'knex'
import { createdAt, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('call_corrections', (t) => {
    t.comment('Dated corrections of a published call; added to, never changed')
    t.increments('id').comment('key')
    reference(t, 'call_id', 'calls', 'RESTRICT', 'which call').notNullable()
    t.string('concerns', 120).notNullable().comment('what it corrects, in a few words')
    t.text('body').notNullable().comment('what holds instead')
    reference(t, 'made_by', 'people', 'RESTRICT', 'who').notNullable()
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('call_corrections')
}
