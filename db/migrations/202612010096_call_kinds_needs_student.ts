import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('call_kinds', (t) => {
    t.boolean('needs_student')
      .notNullable()
      .defaultTo(false)
      .comment('must name a student and a supervisor, both of whom have agreed')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('call_kinds', (t) => {
    t.dropColumn('needs_student')
  })
}
