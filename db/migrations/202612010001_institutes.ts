import type { Knex } from 'knex'
import { createdAt } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('institutes', (t) => {
    t.comment('Institutes people belong to; their class decides a fee')
    t.increments('id').comment('key')
    t.string('name', 200).notNullable().unique().comment('name as printed on letters')
    t.string('country', 2).comment('ISO 3166-1 alpha-2')
    t.enum('affiliation_class', ['member', 'partner', 'other'])
      .notNullable()
      .defaultTo('other')
      .comment('class used by fee schedules')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('institutes')
}
