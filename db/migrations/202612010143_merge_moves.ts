import type { Knex } from 'knex'
import { createdAt, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('merge_moves', (t) => {
    t.comment('Places moved by chairs and deputies of several panels together, with the reason')
    t.increments('id').comment('key')
    reference(t, 'list_id', 'merged_lists', 'RESTRICT', 'which list').notNullable()
    reference(t, 'proposal_id', 'proposals', 'RESTRICT', 'which proposal').notNullable()
    t.integer('from_place').unsigned().notNullable().comment('from')
    t.integer('to_place').unsigned().notNullable().comment('to')
    t.string('reason', 300).notNullable().comment('why')
    reference(t, 'moved_by', 'people', 'SET NULL', 'who')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('merge_moves')
}
