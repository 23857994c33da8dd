import type { Knex } from 'knex'
import { version } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('target_groups', (t) => {
    t.enum('hours_for', ['all', 'at-least'])
      .notNullable()
      .defaultTo('all')
      .comment('whose hours are asked: of all it lists, or of as many as must be done')
    version(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('target_groups', (t) => {
    t.dropColumn('hours_for')
    t.dropColumn('version')
  })
}
