import type { Knex } from 'knex'
import { exactText, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('instrument_modes', (t) => {
    t.comment('Ways an instrument is used')
    t.increments('id').comment('key')
    reference(t, 'instrument_id', 'instruments', 'RESTRICT', 'which instrument').notNullable()
    exactText(t, 'slug', 60, 'short name in addresses').notNullable().unique()
    t.string('name', 120).notNullable().comment('name')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('instrument_modes')
}
