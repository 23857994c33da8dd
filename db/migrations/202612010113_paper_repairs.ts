import type { Knex } from 'knex'
import { createdAt, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('paper_repairs', (t) => {
    t.comment('A paper of a sent proposal opened by the office for one replacement after the deadline')
    t.increments('id').comment('key')
    reference(t, 'proposal_id', 'proposals', 'RESTRICT', 'which proposal').notNullable()
    t.enum('paper_kind', ['justification', 'team-expertise']).notNullable().comment('which paper')
    t.string('reason', 500).notNullable().comment('what is wrong with the file')
    reference(t, 'opened_by', 'people', 'RESTRICT', 'who opened it').notNullable()
    instant(t, 'open_until', 'until when').notNullable()
    instant(t, 'taken_back_at', 'when the office closed it unused')
    reference(
      t,
      'version_id',
      'proposal_versions',
      'RESTRICT',
      'version the replacement became; null while unused',
    )
    createdAt(t)
    t.index(['proposal_id', 'paper_kind'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('paper_repairs')
}
