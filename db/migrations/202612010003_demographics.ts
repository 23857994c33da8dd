import type { Knex } from 'knex'
import { createdAt, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('demographics', (t) => {
    t.comment('Voluntary answers, walled off; read only as counts with small cells suppressed')
    reference(t, 'person_id', 'people', 'CASCADE', 'whose answer').notNullable().primary()
    t.string('purpose', 200).notNullable().comment('what the answer may be used for')
    t.json('answers').notNullable().comment('voluntary answers')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('demographics')
}
