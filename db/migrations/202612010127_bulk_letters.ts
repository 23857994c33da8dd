import type { Knex } from 'knex'
import { createdAt, instant, reference, version } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('bulk_letters', (t) => {
    t.comment('Letters of the office to many; what goes to each stands in the outbox')
    t.increments('id').comment('key')
    t.string('subject', 200).notNullable().comment('subject, with fields in braces')
    t.text('text_body').notNullable().comment('Markdown, with fields in braces')
    t.json('audience').notNullable().comment('call, parts played and states of proposals')
    reference(t, 'written_by', 'people', 'SET NULL', 'who wrote it')
    instant(t, 'queued_at', 'when it was given to the outbox; null while it is a draft')
    t.integer('recipients').unsigned().comment('how many people it went to the outbox for')
    instant(t, 'cancelled_at', 'when what had not been sent was stopped')
    version(t)
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('bulk_letters')
}
