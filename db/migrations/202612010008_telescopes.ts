import type { Knex } from 'knex'
import { exactText, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('telescopes', (t) => {
    t.comment('Telescopes')
    t.increments('id').comment('key')
    reference(t, 'site_id', 'sites', 'RESTRICT', 'where it stands').notNullable()
    exactText(t, 'slug', 40, 'short name in addresses').notNullable().unique()
    t.string('name', 80).notNullable().comment('name')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('telescopes')
}
