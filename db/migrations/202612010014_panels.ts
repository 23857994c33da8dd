import type { Knex } from 'knex'
import { reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('panels', (t) => {
    t.comment('Panels of a call')
    t.increments('id').comment('key')
    reference(t, 'call_id', 'calls', 'RESTRICT', 'which call').notNullable()
    t.string('name', 120).notNullable().comment('name')
    t.integer('quorum').unsigned().notNullable().defaultTo(3).comment('members needed to decide')
    t.unique(['call_id', 'name'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('panels')
}
