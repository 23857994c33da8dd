import type { Knex } from 'knex'
import { instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('assessment_questions', (t) => {
    t.comment('Questions to the investigators, passed on without names')
    t.increments('id').comment('key')
    reference(t, 'request_id', 'assessment_requests', 'RESTRICT', 'which request').notNullable()
    t.text('question').notNullable().comment('question')
    reference(t, 'asked_by', 'people', 'RESTRICT', 'who asked').notNullable()
    instant(t, 'asked_at', 'when').notNullable()
    instant(t, 'due_at', 'answer wanted by').notNullable()
    t.text('answer').comment('answer')
    reference(t, 'answered_by', 'people', 'RESTRICT', 'who answered')
    instant(t, 'answered_at', 'when')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('assessment_questions')
}
