import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('site_records', (t) => {
    t.json('horizon')
      .notNullable()
      .defaultTo('[]')
      .comment('lowest airless altitude by azimuth from north through east, degrees; empty for none')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('site_records', (t) => {
    t.dropColumn('horizon')
  })
}
