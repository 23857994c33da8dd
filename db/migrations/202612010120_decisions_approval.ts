import type { Knex } from 'knex'
import { instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('decisions', (t) => {
    reference(t, 'changed_by', 'people', 'SET NULL', 'who changed it last; someone else approves it')
    reference(t, 'approved_by', 'people', 'SET NULL', 'second person who approved it')
    t.integer('approved_version')
      .unsigned()
      .comment('version that was approved; an approval of an older one no longer counts')
    instant(t, 'approved_at', 'when it was approved')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('decisions', (t) => {
    t.dropForeign('changed_by')
    t.dropForeign('approved_by')
    t.dropColumn('changed_by')
    t.dropColumn('approved_by')
    t.dropColumn('approved_version')
    t.dropColumn('approved_at')
  })
}
