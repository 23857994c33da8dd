import type { Knex } from 'knex'
import { reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('visit_halves', (t) => {
    t.comment('The halves of nights that a visit has; superseded with its award line')
    t.increments('id').comment('key')
    reference(t, 'award_line_id', 'award_lines', 'RESTRICT', 'of which award').notNullable()
    reference(t, 'call_id', 'calls', 'RESTRICT', 'which call').notNullable()
    reference(t, 'telescope_id', 'telescopes', 'RESTRICT', 'which telescope').notNullable()
    t.date('evening_date').notNullable().comment('date of the evening')
    t.enum('half', ['first', 'second']).notNullable().comment('of the dark time')
    t.integer('seconds').unsigned().notNullable().comment('dark time of the half')
    // Null once superseded: nulls do not count against each other, so a half has one visit at most.
    t.integer('holds').unsigned().defaultTo(1).comment('1 while it stands, null afterwards')
    t.unique(['call_id', 'telescope_id', 'evening_date', 'half', 'holds'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('visit_halves')
}
