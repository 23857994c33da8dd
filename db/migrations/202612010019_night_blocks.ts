import type { Knex } from 'knex'
import { reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('night_blocks', (t) => {
    t.comment('Night calendar: what each part of a night is for; the date is that of the evening')
    t.increments('id').comment('key')
    reference(t, 'call_id', 'calls', 'RESTRICT', 'which call').notNullable()
    reference(t, 'telescope_id', 'telescopes', 'RESTRICT', 'which telescope').notNullable()
    reference(t, 'instrument_id', 'instruments', 'RESTRICT', 'instrument mounted, if set')
    t.date('evening_date').notNullable().comment('evening the night begins on')
    t.enum('use_for', ['science', 'engineering', 'promised']).notNullable().comment('what it is for')
    t.decimal('fraction_from', 4, 3)
      .notNullable()
      .defaultTo(0)
      .comment('start as a fraction of the dark time')
    t.decimal('fraction_to', 4, 3).notNullable().defaultTo(1).comment('end as a fraction of the dark time')
    t.integer('dark_seconds')
      .unsigned()
      .notNullable()
      .comment('dark time of the block, computed from the real sky')
    t.unique(['call_id', 'telescope_id', 'evening_date', 'fraction_from'], {
      indexName: 'night_blocks_one_start',
    })
    t.check('fraction_from < fraction_to', [], 'night_blocks_fraction_in_order')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('night_blocks')
}
