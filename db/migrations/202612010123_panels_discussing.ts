import type { Knex } from 'knex'
import { instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('panels', (t) => {
    reference(t, 'discussing_id', 'proposals', 'SET NULL', 'proposal on the table now; null between two')
    instant(t, 'discussing_since', 'since when it is discussed')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('panels', (t) => {
    t.dropForeign('discussing_id')
    t.dropColumn('discussing_id')
    t.dropColumn('discussing_since')
  })
}
