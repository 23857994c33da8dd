import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('site_records', (t) => {
    t.json('weather').comment(
      'lostByMonth: share of nights lost, January to December; persistence: correlation of a night with the one before; null where not recorded',
    )
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('site_records', (t) => {
    t.dropColumn('weather')
  })
}
