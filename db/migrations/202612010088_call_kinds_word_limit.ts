import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('call_kinds', (t) => {
    t.integer('word_limit')
      .unsigned()
      .notNullable()
      .defaultTo(2000)
      .comment('words of justification, where it is written here')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('call_kinds', (t) => {
    t.dropColumn('word_limit')
  })
}
