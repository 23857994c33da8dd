import type { Knex } from 'knex'

/** The column was filled from the kinds that stood; from now on whoever plans a call says it. */
export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('call_kinds', (t) => {
    t.boolean('takes_awaited')
      .notNullable()
      .defaultTo(false)
      .comment('may ask for what is awaited and has no position yet')
      .alter()
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('call_kinds', (t) => {
    t.boolean('takes_awaited')
      .notNullable()
      .defaultTo(knex.raw("(`kind` = 'opportunity')"))
      .comment('may ask for what is awaited and has no position yet')
      .alter()
  })
}
