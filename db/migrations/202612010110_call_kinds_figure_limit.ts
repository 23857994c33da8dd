import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('call_kinds', (t) => {
    t.integer('figure_limit').unsigned().comment('figures in the justification, if limited')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('call_kinds', (t) => t.dropColumn('figure_limit'))
}
