import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('papers', (t) => {
    t.integer('words').unsigned().comment('words that can be read in it; null where they were not counted')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('papers', (t) => t.dropColumn('words'))
}
