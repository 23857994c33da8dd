import type { Knex } from 'knex'
import { reference } from '../columns.ts'

const states = ['queued', 'sending', 'sent', 'parked']

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('outbox', (t) => {
    t.enum('state', [...states, 'bounced', 'cancelled'])
      .notNullable()
      .defaultTo('queued')
      .comment('state; bounced: the address was refused for good')
      .alter()
    reference(t, 'bulk_letter_id', 'bulk_letters', 'RESTRICT', 'letter to many it belongs to')
    reference(t, 'again_of', 'outbox', 'SET NULL', 'letter that was sent once more')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex('outbox').whereIn('state', ['bounced', 'cancelled']).update({ state: 'parked' })
  await knex.schema.alterTable('outbox', (t) => {
    t.dropForeign('bulk_letter_id')
    t.dropForeign('again_of')
    t.dropColumn('bulk_letter_id')
    t.dropColumn('again_of')
    t.enum('state', states).notNullable().defaultTo('queued').comment('state').alter()
  })
}
