import type { Knex } from 'knex'
import { instant } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('invitations', (t) => {
    instant(t, 'role_until_at', 'until when the role holds; null for no end')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('invitations', (t) => {
    t.dropColumn('role_until_at')
  })
}
