import type { Knex } from 'knex'
import { createdAt, exactText, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('receipts', (t) => {
    t.comment('Receipts with consecutive numbers')
    t.increments('id').comment('key')
    exactText(t, 'number', 20, 'number').notNullable().unique()
    reference(t, 'fee_id', 'fees', 'RESTRICT', 'which fee').notNullable()
    reference(t, 'payment_id', 'payments', 'RESTRICT', 'which payment').notNullable().unique()
    t.string('payer', 160).notNullable().comment('who paid')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('receipts')
}
