import type { Knex } from 'knex'
import { createdAt, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('score_events', (t) => {
    t.comment('Scores, one row a change, never altered')
    t.increments('id').comment('key')
    reference(t, 'assignment_id', 'assignments', 'RESTRICT', 'whose').notNullable()
    reference(t, 'criterion_id', 'call_criteria', 'RESTRICT', 'which criterion').notNullable()
    t.integer('criterion_version').unsigned().notNullable().comment('wording scored against')
    t.integer('scale_version').unsigned().notNullable().defaultTo(1).comment('scale: 1 is 0 to 10 in halves')
    t.enum('round', ['before-discussion', 'after-discussion']).notNullable().comment('round')
    t.integer('half_points').unsigned().comment('score in half points, 0 to 20; null takes a score back')
    createdAt(t)
    t.check('half_points IS NULL OR half_points <= 20', [], 'score_events_in_scale')
    t.index(['assignment_id', 'criterion_id', 'round'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('score_events')
}
