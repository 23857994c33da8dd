import type { Knex } from 'knex'
import { instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('panels', (t) => {
    t.string('formula', 300).comment('own measure shown beside the raw mean; fixed when the review opens')
    reference(t, 'formula_by', 'people', 'SET NULL', 'who wrote the formula')
    instant(t, 'formula_at', 'when the formula was written')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('panels', (t) => {
    t.dropForeign('formula_by')
    t.dropColumn('formula')
    t.dropColumn('formula_by')
    t.dropColumn('formula_at')
  })
}
