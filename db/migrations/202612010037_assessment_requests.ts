import type { Knex } from 'knex'
import { createdAt, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('assessment_requests', (t) => {
    t.comment('The request of a proposal on one instrument, for its instrument scientist')
    t.increments('id').comment('key')
    reference(t, 'proposal_id', 'proposals', 'RESTRICT', 'which proposal').notNullable()
    reference(t, 'instrument_id', 'instruments', 'RESTRICT', 'which instrument').notNullable()
    instant(t, 'passed_at', 'when it was passed to the panel')
    createdAt(t)
    t.unique(['proposal_id', 'instrument_id'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('assessment_requests')
}
