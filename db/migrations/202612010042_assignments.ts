import type { Knex } from 'knex'
import { instant, reference, version } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('assignments', (t) => {
    t.comment('Who reviews what')
    t.increments('id').comment('key')
    reference(t, 'proposal_id', 'proposals', 'RESTRICT', 'which proposal').notNullable()
    reference(t, 'person_id', 'people', 'RESTRICT', 'which reviewer').notNullable()
    reference(t, 'panel_id', 'panels', 'RESTRICT', 'on which panel').notNullable()
    t.enum('seat', ['first', 'second', 'reader'])
      .notNullable()
      .defaultTo('reader')
      .comment('first reader, second voice or reader')
    reference(t, 'assigned_by', 'people', 'SET NULL', 'who assigned')
    instant(t, 'assigned_at', 'when').notNullable()
    instant(t, 'finished_at', 'when the review was finished')
    instant(t, 'withdrawn_at', 'when it was taken back')
    t.string('withdrawn_reason', 200).comment('why')
    version(t)
    t.unique(['proposal_id', 'person_id'])
    t.index(['person_id'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('assignments')
}
