import type { Knex } from 'knex'
import { measured } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('telescope_records', (t) => {
    t.json('horizon')
      .notNullable()
      .defaultTo('[]')
      .comment('what stands in its own way: lowest airless altitude by azimuth, degrees; empty for nothing')
    measured(t, 'highest_altitude_deg', 'altitude above which its mount is blind; null where it is not')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('telescope_records', (t) => {
    t.dropColumn('horizon')
    t.dropColumn('highest_altitude_deg')
  })
}
