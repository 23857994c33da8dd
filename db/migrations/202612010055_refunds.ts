import type { Knex } from 'knex'
import { createdAt, exactText, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('refunds', (t) => {
    t.comment('Money given back')
    t.increments('id').comment('key')
    reference(t, 'payment_id', 'payments', 'RESTRICT', 'of which payment').notNullable()
    exactText(t, 'idempotency_key', 64, 'key sent with the create').notNullable().unique()
    exactText(t, 'provider_refund_id', 120, 'refund').unique()
    t.integer('amount_minor').unsigned().notNullable().comment('amount')
    t.enum('state', ['created', 'succeeded', 'failed']).notNullable().defaultTo('created').comment('state')
    t.string('reason', 300).notNullable().comment('why')
    reference(t, 'made_by', 'people', 'SET NULL', 'who')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('refunds')
}
