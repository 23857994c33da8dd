import type { Knex } from 'knex'
import { instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('proposals', (t) => {
    reference(
      t,
      'continues_id',
      'proposals',
      'SET NULL',
      'proposal of an earlier call it was carried on from',
    )
    reference(t, 'lead_offered_to', 'people', 'SET NULL', 'member asked to lead it; leads once they accept')
    instant(t, 'lead_offered_at', 'when they were asked')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('proposals', (t) => {
    t.dropForeign('continues_id')
    t.dropForeign('lead_offered_to')
    t.dropColumn('continues_id')
    t.dropColumn('lead_offered_to')
    t.dropColumn('lead_offered_at')
  })
}
