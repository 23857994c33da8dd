import type { Knex } from 'knex'
import { createdAt, instant, reference, version } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('fees', (t) => {
    t.comment('What a proposal owes')
    t.increments('id').comment('key')
    reference(t, 'proposal_id', 'proposals', 'RESTRICT', 'which proposal').notNullable().unique()
    t.integer('amount_minor').unsigned().notNullable().comment('amount in minor units')
    t.specificType('currency', 'CHAR(3) CHARACTER SET ascii NOT NULL').comment('ISO 4217')
    t.enum('state', ['due', 'paid', 'waived', 'invoiced', 'refunded', 'lapsed'])
      .notNullable()
      .defaultTo('due')
      .comment('state')
    instant(t, 'due_at', 'settled by').notNullable()
    instant(t, 'settled_at', 'when it was settled')
    version(t)
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('fees')
}
