import type { Knex } from 'knex'
import { createdAt, exactText, instant, reference, version } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('invoices', (t) => {
    t.comment(
      'Invoices to institutes, with consecutive numbers; never changed but to be settled or cancelled',
    )
    t.increments('id').comment('key')
    exactText(t, 'number', 20, 'number').notNullable().unique()
    reference(t, 'fee_id', 'fees', 'RESTRICT', 'which fee').notNullable()
    t.string('institute', 200).notNullable().comment('who is to pay')
    t.string('address', 500).notNullable().comment('postal address, lines as typed')
    t.string('purchase_order', 60).notNullable().defaultTo('').comment('purchase order of the institute')
    t.string('send_to', 254).notNullable().comment('address the invoice is mailed to')
    t.integer('amount_minor').unsigned().notNullable().comment('amount in minor units')
    t.specificType('currency', 'CHAR(3) CHARACTER SET ascii NOT NULL').comment('ISO 4217')
    t.enum('state', ['open', 'settled', 'cancelled']).notNullable().defaultTo('open').comment('state')
    instant(t, 'due_at', 'to be paid by').notNullable()
    reference(t, 'asked_by', 'people', 'SET NULL', 'who asked for it')
    t.date('settled_on').comment('day the money reached the bank')
    t.string('settled_reference', 140)
      .notNullable()
      .defaultTo('')
      .comment('reference on the statement of the bank')
    reference(t, 'closed_by', 'people', 'SET NULL', 'who settled or cancelled it')
    instant(t, 'closed_at', 'when')
    version(t)
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('invoices')
}
