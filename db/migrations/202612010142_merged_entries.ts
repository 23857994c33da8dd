import type { Knex } from 'knex'
import { measured, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('merged_entries', (t) => {
    t.comment('Places in a list of all panels')
    t.increments('id').comment('key')
    reference(t, 'list_id', 'merged_lists', 'RESTRICT', 'which list').notNullable()
    reference(t, 'proposal_id', 'proposals', 'RESTRICT', 'which proposal').notNullable()
    reference(
      t,
      'ranking_id',
      'rankings',
      'RESTRICT',
      'frozen list of its panel that it comes from',
    ).notNullable()
    t.integer('place').unsigned().notNullable().comment('place, 1 first')
    measured(t, 'used_share', 'part of its panel’s share used with it; null where the panel has no share')
    t.boolean('is_near').notNullable().comment('near a panel’s line: a meeting may move it')
    t.unique(['list_id', 'proposal_id'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('merged_entries')
}
