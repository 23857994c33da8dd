import type { Knex } from 'knex'
import { createdAt, exactText, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('invitations', (t) => {
    t.comment('Invitations by e-mail that grant a role')
    t.increments('id').comment('key')
    exactText(t, 'token_hash', 64, 'SHA-256 of the token, hex').notNullable().unique()
    t.string('email', 254).notNullable().comment('to whom')
    t.string('name', 160).notNullable().defaultTo('').comment('name as the inviter wrote it')
    t.enum('role', ['reviewer', 'chair', 'instrument-scientist', 'office'])
      .notNullable()
      .comment('role it grants')
    reference(t, 'call_id', 'calls', 'CASCADE', 'call of the role')
    reference(t, 'panel_id', 'panels', 'CASCADE', 'panel of the role')
    reference(t, 'instrument_id', 'instruments', 'CASCADE', 'instrument of the role')
    reference(t, 'invited_by', 'people', 'SET NULL', 'who invited')
    instant(t, 'expires_at', 'when it stops working').notNullable()
    instant(t, 'accepted_at', 'when it was accepted')
    reference(t, 'accepted_by', 'people', 'SET NULL', 'who accepted')
    instant(t, 'withdrawn_at', 'when the office took it back')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('invitations')
}
