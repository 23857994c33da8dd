import type { Knex } from 'knex'
import { exactText } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('outbox', (t) => {
    exactText(t, 'attachment', 20, 'number of the invoice or credit note that goes with it')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('outbox', (t) => {
    t.dropColumn('attachment')
  })
}
