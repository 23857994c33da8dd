import type { Knex } from 'knex'
import { instant } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('ranking_entries', (t) => {
    instant(t, 'set_aside_at', 'when it was set aside as not to be discussed; null while it is on the list')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('ranking_entries', (t) => {
    t.dropColumn('set_aside_at')
  })
}
