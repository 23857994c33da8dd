import type { Knex } from 'knex'
import { reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('fee_rates', (t) => {
    t.comment('Fee of a kind of proposal by the class of the institute that leads')
    t.increments('id').comment('key')
    reference(t, 'call_kind_id', 'call_kinds', 'CASCADE', 'which kind').notNullable()
    t.enum('affiliation_class', ['member', 'partner', 'other']).notNullable().comment('class')
    t.integer('amount_minor').unsigned().notNullable().comment('fee in minor units of the call currency')
    t.integer('late_minor')
      .unsigned()
      .notNullable()
      .defaultTo(0)
      .comment('added when it is sent after the deadline, under an extension')
    t.unique(['call_kind_id', 'affiliation_class'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('fee_rates')
}
