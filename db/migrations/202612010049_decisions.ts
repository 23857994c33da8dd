import type { Knex } from 'knex'
import { createdAt, instant, reference, version } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('decisions', (t) => {
    t.comment('Outcomes by version; released ones are what the investigators read')
    t.increments('id').comment('key')
    reference(t, 'proposal_id', 'proposals', 'RESTRICT', 'which proposal').notNullable()
    t.integer('decision_version').unsigned().notNullable().comment('counts from 1')
    t.enum('outcome', ['awarded', 'reserve', 'declined']).notNullable().comment('outcome')
    t.text('statement').notNullable().comment('what the panel says to the investigators')
    reference(t, 'decided_by', 'people', 'SET NULL', 'who')
    instant(t, 'released_at', 'when it was made known')
    instant(t, 'superseded_at', 'when a newer one took its place')
    version(t)
    createdAt(t)
    t.unique(['proposal_id', 'decision_version'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('decisions')
}
