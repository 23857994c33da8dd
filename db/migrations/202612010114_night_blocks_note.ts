import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('night_blocks', (t) => {
    t.string('note', 120).notNullable().defaultTo('').comment('to whom it is promised, or what is done')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('night_blocks', (t) => t.dropColumn('note'))
}
