import type { Knex } from 'knex'
import { createdAt, exactText, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('credit_notes', (t) => {
    t.comment('Credit notes with consecutive numbers: for a cancelled invoice, or for money given back')
    t.increments('id').comment('key')
    exactText(t, 'number', 20, 'number').notNullable().unique()
    reference(t, 'fee_id', 'fees', 'RESTRICT', 'which fee').notNullable()
    reference(t, 'invoice_id', 'invoices', 'RESTRICT', 'invoice it takes back, if one')
    reference(t, 'refund_id', 'refunds', 'RESTRICT', 'refund it stands for, if one').unique()
    t.string('credited_to', 200).notNullable().comment('institute or person')
    t.string('address', 500).notNullable().defaultTo('').comment('postal address, lines as typed')
    t.integer('amount_minor').unsigned().notNullable().comment('amount in minor units')
    t.specificType('currency', 'CHAR(3) CHARACTER SET ascii NOT NULL').comment('ISO 4217')
    t.string('reason', 300).notNullable().comment('why')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('credit_notes')
}
