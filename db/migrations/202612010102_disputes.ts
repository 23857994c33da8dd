import type { Knex } from 'knex'
import { createdAt, exactText, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('disputes', (t) => {
    t.comment('Payments a card holder disputes with the bank')
    t.increments('id').comment('key')
    reference(t, 'payment_id', 'payments', 'RESTRICT', 'which payment').notNullable()
    exactText(t, 'provider_dispute_id', 120, 'dispute').notNullable().unique()
    t.integer('amount_minor').unsigned().notNullable().comment('amount the bank holds')
    t.string('reason', 60).notNullable().comment('why, in the word of the firm')
    t.enum('state', ['open', 'won', 'lost']).notNullable().defaultTo('open').comment('state')
    instant(t, 'closed_at', 'when the bank decided')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('disputes')
}
