import type { Knex } from 'knex'
import { createdAt, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('assessments', (t) => {
    t.comment('What the instrument scientist says; a later one supersedes, none is overwritten')
    t.increments('id').comment('key')
    reference(t, 'request_id', 'assessment_requests', 'RESTRICT', 'which request').notNullable()
    t.enum('verdict', ['accepted', 'change', 'not-possible']).notNullable().comment('verdict')
    t.integer('true_seconds').unsigned().notNullable().comment('hours it truly takes, in seconds')
    t.string('reason', 500).notNullable().comment('reason, read by the investigators and the panel')
    t.text('panel_note').notNullable().comment('note the panel alone reads')
    reference(t, 'assessed_by', 'people', 'RESTRICT', 'who').notNullable()
    instant(t, 'superseded_at', 'when a later one took its place')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('assessments')
}
