import type { Knex } from 'knex'
import { createdAt, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('programmes', (t) => {
    t.comment('A programme lives over several calls')
    t.increments('id').comment('key')
    t.string('title', 240).notNullable().comment('title')
    reference(t, 'lead_person_id', 'people', 'RESTRICT', 'who leads it').notNullable()
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('programmes')
}
