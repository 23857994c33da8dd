import type { Knex } from 'knex'
import { instant, reference, version } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('review_texts', (t) => {
    t.comment('What a reviewer writes beside the scores')
    t.increments('id').comment('key')
    reference(t, 'assignment_id', 'assignments', 'RESTRICT', 'whose').notNullable()
    t.enum('audience', ['investigators', 'panel', 'private']).notNullable().comment('who reads it')
    t.text('body').notNullable().comment('text')
    version(t)
    instant(t, 'saved_at', 'when').notNullable()
    t.unique(['assignment_id', 'audience'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('review_texts')
}
