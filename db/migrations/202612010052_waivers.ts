import type { Knex } from 'knex'
import { createdAt, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('waivers', (t) => {
    t.comment('Requests to waive a fee')
    t.increments('id').comment('key')
    reference(t, 'fee_id', 'fees', 'RESTRICT', 'which fee').notNullable()
    t.text('reason').notNullable().comment('why it is asked')
    t.enum('state', ['asked', 'granted', 'refused']).notNullable().defaultTo('asked').comment('state')
    reference(t, 'asked_by', 'people', 'RESTRICT', 'who asked').notNullable()
    reference(t, 'decided_by', 'people', 'SET NULL', 'who decided')
    t.string('decision_note', 300).notNullable().defaultTo('').comment('what was said')
    instant(t, 'decided_at', 'when')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('waivers')
}
