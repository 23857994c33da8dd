import type { Knex } from 'knex'
import { measured, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('ranking_entries', (t) => {
    t.comment('Places in a ranked list')
    t.increments('id').comment('key')
    reference(t, 'ranking_id', 'rankings', 'RESTRICT', 'which list').notNullable()
    reference(t, 'proposal_id', 'proposals', 'RESTRICT', 'which proposal').notNullable()
    t.integer('place').unsigned().notNullable().comment('place, 1 first')
    measured(t, 'raw_mean', 'mean weighted score when listed')
    t.unique(['ranking_id', 'proposal_id'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('ranking_entries')
}
