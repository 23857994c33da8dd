import type { Knex } from 'knex'
import { createdAt, exactText, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('payments', (t) => {
    t.comment('Attempts to pay a fee through the payment firm')
    t.increments('id').comment('key')
    reference(t, 'fee_id', 'fees', 'RESTRICT', 'which fee').notNullable()
    exactText(t, 'idempotency_key', 64, 'key sent with the create').notNullable().unique()
    exactText(t, 'provider_session_id', 120, 'checkout session').unique()
    exactText(t, 'provider_payment_id', 120, 'payment')
    t.text('checkout_url').comment('hosted page')
    t.integer('amount_minor').unsigned().notNullable().comment('amount')
    t.specificType('currency', 'CHAR(3) CHARACTER SET ascii NOT NULL').comment('ISO 4217')
    t.enum('state', ['created', 'open', 'succeeded', 'failed', 'expired'])
      .notNullable()
      .defaultTo('created')
      .comment('state')
    t.string('card_last4', 4).comment('last four digits, as the firm reports them')
    t.string('failure', 200).comment('why it failed, in the words of the firm')
    reference(t, 'started_by', 'people', 'SET NULL', 'who')
    instant(t, 'succeeded_at', 'when the money came')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('payments')
}
