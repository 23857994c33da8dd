import type { Knex } from 'knex'
import { instant } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('panel_members', (t) => {
    instant(t, 'present_at', 'since when the member is at the meeting; null while absent')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('panel_members', (t) => {
    t.dropColumn('present_at')
  })
}
