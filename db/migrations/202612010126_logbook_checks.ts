import type { Knex } from 'knex'
import { instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('logbook_checks', (t) => {
    t.comment('Each time the whole logbook was computed anew, and what was found')
    t.increments('id').comment('key')
    instant(t, 'checked_at', 'when').notNullable()
    reference(t, 'checked_by', 'people', 'SET NULL', 'who asked; null for the clock')
    t.integer('rows_checked').unsigned().notNullable().comment('rows that follow from the one before')
    t.string('fault', 300).comment('what does not follow, in words; null when the chain is whole')
    t.index(['checked_at'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('logbook_checks')
}
