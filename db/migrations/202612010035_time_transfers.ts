import type { Knex } from 'knex'
import { createdAt, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('time_transfers', (t) => {
    t.comment('Movements of time between accounts of a proposal; entries of one sum to zero')
    t.increments('id').comment('key')
    reference(t, 'proposal_id', 'proposals', 'RESTRICT', 'which proposal').notNullable()
    reference(t, 'observation_id', 'observations', 'SET NULL', 'which observation, if one')
    t.string('share', 60).notNullable().defaultTo('').comment('partner share, where there is one')
    t.string('reason', 200).notNullable().comment('why')
    reference(t, 'made_by', 'people', 'SET NULL', 'who')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('time_transfers')
}
