import type { Knex } from 'knex'
import { createdAt, exactText, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('payment_events', (t) => {
    t.comment('Notices of the payment firm, stored once in the transaction of their effect')
    t.increments('id').comment('key')
    exactText(t, 'provider_event_id', 120, 'id of the notice').notNullable().unique()
    exactText(t, 'event_type', 80, 'type').notNullable()
    reference(t, 'payment_id', 'payments', 'RESTRICT', 'payment it speaks of')
    t.json('payload').notNullable().comment('notice as received')
    t.string('effect', 120).notNullable().comment('what it changed')
    instant(t, 'provider_created_at', 'when the firm made it').notNullable()
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('payment_events')
}
