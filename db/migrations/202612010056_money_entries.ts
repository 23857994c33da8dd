import type { Knex } from 'knex'
import { createdAt, exactText, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('money_entries', (t) => {
    t.comment('Ledger of money; the entries of one movement sum to zero')
    t.increments('id').comment('key')
    exactText(t, 'movement', 64, 'movement the entry belongs to').notNullable()
    reference(t, 'fee_id', 'fees', 'RESTRICT', 'which fee').notNullable()
    t.enum('account', ['receivable', 'income', 'provider', 'waived', 'refunds'])
      .notNullable()
      .comment('account')
    t.integer('amount_minor').notNullable().comment('signed amount')
    t.specificType('currency', 'CHAR(3) CHARACTER SET ascii NOT NULL').comment('ISO 4217')
    createdAt(t)
    t.unique(['movement', 'account'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('money_entries')
}
