import type { Knex } from 'knex'
import { exactText } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('sites', (t) => {
    t.comment('Observing sites')
    t.increments('id').comment('key')
    exactText(t, 'slug', 40, 'short name in addresses').notNullable().unique()
    t.string('name', 120).notNullable().comment('name of the observatory')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('sites')
}
