import type { Knex } from 'knex'
import { createdAt, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('night_choices', (t) => {
    t.comment(
      'What the chair lays down about giving nights to a proposal, whatever its rank; superseded, never overwritten',
    )
    t.increments('id').comment('key')
    reference(t, 'proposal_id', 'proposals', 'RESTRICT', 'which proposal').notNullable()
    t.enum('choice', ['must', 'never', 'filler'])
      .notNullable()
      .comment('must be given, never, or bright time that is left')
    t.string('reason', 500).notNullable().comment('why')
    reference(t, 'made_by', 'people', 'RESTRICT', 'who').notNullable()
    instant(t, 'superseded_at', 'when another took its place, or it was taken back')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('night_choices')
}
