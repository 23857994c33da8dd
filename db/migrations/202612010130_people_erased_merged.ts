import type { Knex } from 'knex'
import { instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('people', (t) => {
    instant(t, 'erasure_asked_at', 'when the person asked to be erased')
    instant(t, 'erased_at', 'when what speaks of the person was blanked')
    reference(t, 'merged_into_id', 'people', 'RESTRICT', 'account that took over all that was theirs')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('people', (t) => {
    t.dropForeign('merged_into_id')
    t.dropColumn('merged_into_id')
    t.dropColumn('erased_at')
    t.dropColumn('erasure_asked_at')
  })
}
