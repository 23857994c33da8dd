import type { Knex } from 'knex'
import { createdAt, exactText, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('billing_records', (t) => {
    t.comment('Who writes invoices and where they are paid to; a change is a new version, never an update')
    t.increments('id').comment('key')
    t.integer('record_version').unsigned().notNullable().unique().comment('from one up; the highest holds')
    t.string('name', 160).notNullable().comment('who writes the invoice')
    t.string('address', 500).notNullable().comment('postal address, lines as typed')
    t.string('tax_number', 40).notNullable().defaultTo('').comment('tax number, if there is one')
    t.string('contact', 254).notNullable().comment('address for questions')
    t.string('account_holder', 160).notNullable().comment('holder of the account')
    exactText(t, 'iban', 34, 'account, ISO 13616, without spaces').notNullable()
    exactText(t, 'bic', 11, 'bank, ISO 9362').notNullable()
    t.string('bank', 160).notNullable().comment('name of the bank')
    reference(t, 'saved_by', 'people', 'SET NULL', 'who wrote this version')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('billing_records')
}
