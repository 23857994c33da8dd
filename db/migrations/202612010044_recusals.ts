import type { Knex } from 'knex'
import { createdAt, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('recusals', (t) => {
    t.comment('A reviewer left a proposal; an event, never undone')
    t.increments('id').comment('key')
    reference(t, 'assignment_id', 'assignments', 'RESTRICT', 'which assignment').notNullable()
    t.string('reason', 300).notNullable().comment('why')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('recusals')
}
