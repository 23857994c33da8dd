import type { Knex } from 'knex'
import { createdAt, exactText, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('email_tokens', (t) => {
    t.comment('Single-use links sent by e-mail')
    t.increments('id').comment('key')
    reference(t, 'person_id', 'people', 'CASCADE', 'for whom').notNullable()
    t.enum('purpose', ['confirm', 'reset']).notNullable().comment('what the link does')
    exactText(t, 'token_hash', 64, 'SHA-256 of the token, hex').notNullable().unique()
    instant(t, 'expires_at', 'when it stops working').notNullable()
    instant(t, 'used_at', 'when it was used')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('email_tokens')
}
