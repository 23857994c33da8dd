import type { Knex } from 'knex'
import { instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('interest_declarations', (t) => {
    t.comment('A reviewer has been through the list of investigators of a call')
    t.increments('id').comment('key')
    reference(t, 'person_id', 'people', 'RESTRICT', 'who declared').notNullable()
    reference(t, 'call_id', 'calls', 'RESTRICT', 'which call').notNullable()
    instant(t, 'declared_at', 'when').notNullable()
    t.unique(['person_id', 'call_id'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('interest_declarations')
}
