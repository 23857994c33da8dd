import type { Knex } from 'knex'
import { instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('review_texts', (t) => {
    instant(t, 'withheld_at', 'when a comment was kept from the investigators; null while they may read it')
    reference(t, 'withheld_by', 'people', 'SET NULL', 'who kept it from them')
    t.string('withheld_reason', 200).comment('why')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('review_texts', (t) => {
    t.dropForeign('withheld_by')
    t.dropColumn('withheld_at')
    t.dropColumn('withheld_by')
    t.dropColumn('withheld_reason')
  })
}
