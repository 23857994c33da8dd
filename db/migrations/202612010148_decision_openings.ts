import type { Knex } from 'knex'
import { createdAt, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('decision_openings', (t) => {
    t.comment('Who has opened which version of a decision: none is approved unread')
    t.increments('id').comment('key')
    reference(t, 'decision_id', 'decisions', 'RESTRICT', 'which decision').notNullable()
    t.integer('version').unsigned().notNullable().comment('version of it that was on screen')
    reference(t, 'person_id', 'people', 'RESTRICT', 'who opened it').notNullable()
    createdAt(t)
    t.unique(['decision_id', 'version', 'person_id'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('decision_openings')
}
