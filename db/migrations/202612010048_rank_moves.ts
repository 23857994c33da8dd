import type { Knex } from 'knex'
import { createdAt, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('rank_moves', (t) => {
    t.comment('Places moved by hand, with the reason')
    t.increments('id').comment('key')
    reference(t, 'ranking_id', 'rankings', 'RESTRICT', 'which list').notNullable()
    reference(t, 'proposal_id', 'proposals', 'RESTRICT', 'which proposal').notNullable()
    t.integer('from_place').unsigned().notNullable().comment('from')
    t.integer('to_place').unsigned().notNullable().comment('to')
    t.string('reason', 300).notNullable().comment('why')
    reference(t, 'moved_by', 'people', 'SET NULL', 'who')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('rank_moves')
}
