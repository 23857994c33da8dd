import type { Knex } from 'knex'
import { createdAt, exactText, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('sessions', (t) => {
    t.comment('Signed-in browsers; a token without a live row is worth nothing')
    exactText(t, 'id_hash', 64, 'SHA-256 of the session id, hex').notNullable().primary()
    reference(t, 'person_id', 'people', 'CASCADE', 'who is signed in').notNullable()
    instant(t, 'last_seen_at', 'last use').notNullable()
    instant(t, 'expires_at', 'absolute end').notNullable()
    instant(t, 'ended_at', 'signed out, disabled or password changed')
    t.string('user_agent', 200).notNullable().defaultTo('').comment('browser, as it names itself')
    createdAt(t)
    t.index(['person_id', 'ended_at'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('sessions')
}
