import type { Knex } from 'knex'

/** What a kind of proposal asks of its authors, as data: no name of a kind decides anything. */
export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('call_kinds', (t) => {
    t.integer('target_limit').unsigned().comment('targets it may name, if limited')
    t.boolean('takes_awaited')
      .notNullable()
      .defaultTo(knex.raw("(`kind` = 'opportunity')"))
      .comment('may ask for what is awaited and has no position yet')
    t.boolean('needs_cadence')
      .notNullable()
      .defaultTo(false)
      .comment('must say how often each observation is repeated')
    t.boolean('needs_last_night')
      .notNullable()
      .defaultTo(false)
      .comment('must say by when each observation is needed')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('call_kinds', (t) => {
    t.dropColumns('target_limit', 'takes_awaited', 'needs_cadence', 'needs_last_night')
  })
}
