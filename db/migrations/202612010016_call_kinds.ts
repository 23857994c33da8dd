import type { Knex } from 'knex'
import { exactText, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('call_kinds', (t) => {
    t.comment('Kinds of proposal a call takes, each with its own limits')
    t.increments('id').comment('key')
    reference(t, 'call_id', 'calls', 'RESTRICT', 'which call').notNullable()
    exactText(t, 'kind', 20, 'regular, large, thesis, monitoring, opportunity, discretion').notNullable()
    t.string('title', 120).notNullable().comment('title on screen')
    instant(t, 'closes_at', 'own deadline, where it differs')
    t.integer('page_limit').unsigned().notNullable().comment('pages of justification')
    t.integer('abstract_limit').unsigned().notNullable().comment('characters of abstract')
    t.integer('max_seconds').unsigned().comment('most time that may be asked, seconds')
    t.integer('fee_minor')
      .unsigned()
      .notNullable()
      .defaultTo(0)
      .comment('fee in minor units of the call currency')
    reference(t, 'panel_id', 'panels', 'RESTRICT', 'panel that judges it').notNullable()
    t.unique(['call_id', 'kind'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('call_kinds')
}
