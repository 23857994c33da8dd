import type { Knex } from 'knex'
import { createdAt, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('role_grants', (t) => {
    t.comment('Roles, scoped to a call, panel or instrument and to dates')
    t.increments('id').comment('key')
    reference(t, 'person_id', 'people', 'CASCADE', 'who').notNullable()
    t.enum('role', ['investigator', 'reviewer', 'chair', 'instrument-scientist', 'office'])
      .notNullable()
      .comment('role')
    reference(t, 'call_id', 'calls', 'CASCADE', 'only in this call')
    reference(t, 'panel_id', 'panels', 'CASCADE', 'only on this panel')
    reference(t, 'instrument_id', 'instruments', 'CASCADE', 'only for this instrument')
    instant(t, 'from_at', 'holds from').notNullable()
    instant(t, 'until_at', 'holds until')
    reference(t, 'granted_by', 'people', 'SET NULL', 'who gave it')
    instant(t, 'revoked_at', 'when it was taken back')
    createdAt(t)
    t.index(['person_id', 'role'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('role_grants')
}
