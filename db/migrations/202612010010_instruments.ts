import type { Knex } from 'knex'
import { exactText, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('instruments', (t) => {
    t.comment('Instruments')
    t.increments('id').comment('key')
    reference(t, 'telescope_id', 'telescopes', 'RESTRICT', 'which telescope carries it').notNullable()
    exactText(t, 'slug', 40, 'short name in addresses').notNullable().unique()
    t.string('name', 80).notNullable().comment('name')
    t.string('summary', 200).notNullable().comment('what it is, in a few words')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('instruments')
}
