import type { Knex } from 'knex'
import { createdAt, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('award_lines', (t) => {
    t.comment('Time given, line by line; superseded, never overwritten')
    t.increments('id').comment('key')
    reference(t, 'decision_id', 'decisions', 'RESTRICT', 'which decision').notNullable()
    reference(t, 'instrument_id', 'instruments', 'RESTRICT', 'which instrument').notNullable()
    reference(t, 'observation_id', 'observations', 'SET NULL', 'which observation, if one')
    t.integer('seconds').unsigned().notNullable().comment('time given')
    t.enum('service', ['queue', 'visitor']).notNullable().defaultTo('queue').comment('how it is observed')
    t.string('conditions', 300).notNullable().defaultTo('').comment('conditions')
    t.boolean('is_reserve').notNullable().defaultTo(false).comment('reserve')
    instant(t, 'superseded_at', 'when a newer line took its place')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('award_lines')
}
