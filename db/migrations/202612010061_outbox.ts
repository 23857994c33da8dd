import type { Knex } from 'knex'
import { createdAt, exactText, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('outbox', (t) => {
    t.comment('Letters to be sent, written in the transaction of what they tell')
    t.increments('id').comment('key')
    exactText(t, 'dedupe_key', 120, 'one letter a cause and person').notNullable().unique()
    exactText(t, 'message_id', 120, 'Message-ID, the same at every try').notNullable().unique()
    exactText(t, 'template', 60, 'which letter').notNullable()
    reference(t, 'person_id', 'people', 'SET NULL', 'to whom, if an account')
    t.string('to_email', 254).notNullable().comment('address')
    t.string('to_name', 160).notNullable().defaultTo('').comment('name')
    t.string('subject', 240).notNullable().comment('subject')
    t.text('text_body').notNullable().comment('plain text')
    t.text('html_body', 'mediumtext').notNullable().comment('HTML')
    t.enum('state', ['queued', 'sending', 'sent', 'parked'])
      .notNullable()
      .defaultTo('queued')
      .comment('state')
    t.integer('attempts').unsigned().notNullable().defaultTo(0).comment('tries so far')
    instant(t, 'next_attempt_at', 'next try').notNullable()
    instant(t, 'claimed_until', 'a relay holds it until then')
    t.string('last_error', 300).comment('what the mail server said')
    instant(t, 'sent_at', 'when the mail server took it')
    createdAt(t)
    t.index(['state', 'next_attempt_at'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('outbox')
}
