import type { Knex } from 'knex'
import { reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('call_criteria', (t) => {
    t.comment('What proposals are judged by, with weights')
    t.increments('id').comment('key')
    reference(t, 'call_id', 'calls', 'RESTRICT', 'which call').notNullable()
    t.integer('position').unsigned().notNullable().comment('order on the sheet')
    t.string('title', 120).notNullable().comment('criterion')
    t.string('prompt', 240).notNullable().comment('question the reviewer answers')
    t.integer('weight').unsigned().notNullable().comment('parts of the whole')
    t.integer('criterion_version')
      .unsigned()
      .notNullable()
      .defaultTo(1)
      .comment('raised when the wording changes')
    t.unique(['call_id', 'position'])
    t.check('weight > 0', [], 'call_criteria_weight_positive')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('call_criteria')
}
