import type { Knex } from 'knex'
import { createdAt, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('held_hours', (t) => {
    t.comment(
      'Time of a call held back on a telescope, for the director and targets of opportunity; superseded, never overwritten',
    )
    t.increments('id').comment('key')
    reference(t, 'call_id', 'calls', 'RESTRICT', 'which call').notNullable()
    reference(t, 'telescope_id', 'telescopes', 'RESTRICT', 'which telescope').notNullable()
    t.integer('seconds').unsigned().notNullable().comment('time held back')
    t.string('reason', 500).notNullable().comment('what for')
    reference(t, 'made_by', 'people', 'RESTRICT', 'who').notNullable()
    instant(t, 'superseded_at', 'when another took its place')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('held_hours')
}
