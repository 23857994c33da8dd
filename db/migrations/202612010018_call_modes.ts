import type { Knex } from 'knex'
import { reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('call_modes', (t) => {
    t.comment('Instrument modes on offer in a call')
    t.increments('id').comment('key')
    reference(t, 'call_id', 'calls', 'RESTRICT', 'which call').notNullable()
    reference(t, 'mode_id', 'instrument_modes', 'RESTRICT', 'which mode').notNullable()
    t.unique(['call_id', 'mode_id'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('call_modes')
}
