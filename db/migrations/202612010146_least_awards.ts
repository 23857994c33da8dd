import type { Knex } from 'knex'
import { createdAt, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('least_awards', (t) => {
    t.comment(
      'A least useful award set by the chair in the place of the investigators’ own; superseded, never overwritten',
    )
    t.increments('id').comment('key')
    reference(t, 'proposal_id', 'proposals', 'RESTRICT', 'which proposal').notNullable()
    reference(t, 'instrument_id', 'instruments', 'RESTRICT', 'on which instrument').notNullable()
    t.integer('seconds').unsigned().notNullable().comment('least award that is of use')
    t.string('reason', 500).notNullable().comment('why')
    reference(t, 'made_by', 'people', 'RESTRICT', 'who').notNullable()
    instant(t, 'superseded_at', 'when another took its place, or it was taken back')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('least_awards')
}
