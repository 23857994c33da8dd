import type { Knex } from 'knex'
import { createdAt, reference, version } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('service_wishes', (t) => {
    t.comment(
      'How a proposal wishes to be given time on an instrument: the least of use, in the queue or on a visit',
    )
    t.increments('id').comment('key')
    reference(t, 'proposal_id', 'proposals', 'RESTRICT', 'which proposal').notNullable()
    reference(t, 'instrument_id', 'instruments', 'RESTRICT', 'which instrument').notNullable()
    t.integer('least_seconds')
      .unsigned()
      .comment('least award that is of use; null for half of what is asked')
    t.integer('visit_nights').unsigned().comment('nights of a visit; null for the queue')
    t.enum('visit_part', ['whole', 'first', 'second'])
      .notNullable()
      .defaultTo('whole')
      .comment('which half of each of its nights, or the whole')
    t.boolean('visit_together').notNullable().defaultTo(true).comment('its nights follow one another')
    version(t)
    createdAt(t)
    t.unique(['proposal_id', 'instrument_id'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('service_wishes')
}
