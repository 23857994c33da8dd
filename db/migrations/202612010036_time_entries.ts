import type { Knex } from 'knex'
import { reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('time_entries', (t) => {
    t.comment('The two or more sides of a movement of time, integer seconds')
    t.increments('id').comment('key')
    reference(t, 'transfer_id', 'time_transfers', 'RESTRICT', 'which movement').notNullable()
    t.enum('account', [
      'outside',
      'asked',
      'recommended',
      'awarded',
      'scheduled',
      'executed',
      'lost',
      'carried',
    ])
      .notNullable()
      .comment('account')
    t.integer('seconds').notNullable().comment('signed seconds')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('time_entries')
}
