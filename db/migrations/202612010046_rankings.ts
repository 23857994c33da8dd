import type { Knex } from 'knex'
import { createdAt, instant, reference, version } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('rankings', (t) => {
    t.comment('Ranked lists of a panel; frozen ones stay')
    t.increments('id').comment('key')
    reference(t, 'panel_id', 'panels', 'RESTRICT', 'which panel').notNullable()
    t.integer('ranking_version').unsigned().notNullable().comment('counts from 1')
    t.integer('line_after').unsigned().comment('the line is drawn after this rank')
    instant(t, 'frozen_at', 'when it was frozen')
    reference(t, 'made_by', 'people', 'SET NULL', 'who')
    instant(t, 'superseded_at', 'when a newer one took its place')
    version(t)
    createdAt(t)
    t.unique(['panel_id', 'ranking_version'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('rankings')
}
