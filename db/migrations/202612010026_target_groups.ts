import type { Knex } from 'knex'
import { reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('target_groups', (t) => {
    t.comment('Groups of targets with a rule')
    t.increments('id').comment('key')
    reference(t, 'proposal_id', 'proposals', 'CASCADE', 'which proposal').notNullable()
    t.string('name', 120).notNullable().comment('name')
    t.enum('rule', ['all', 'at-least', 'backup']).notNullable().comment('which of them must be done')
    t.integer('at_least').unsigned().comment('how many, for at-least')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('target_groups')
}
