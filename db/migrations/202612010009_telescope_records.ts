import type { Knex } from 'knex'
import { createdAt, measured, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('telescope_records', (t) => {
    t.comment('Telescope facts, versioned by date')
    t.increments('id').comment('key')
    reference(t, 'telescope_id', 'telescopes', 'RESTRICT', 'which telescope').notNullable()
    t.integer('record_version').unsigned().notNullable().comment('counts from 1')
    t.date('valid_from').notNullable().comment('first evening it holds for')
    measured(t, 'aperture_m', 'diameter of the primary').notNullable()
    measured(t, 'collecting_area_m2', 'unobstructed collecting area').notNullable()
    createdAt(t)
    t.unique(['telescope_id', 'record_version'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('telescope_records')
}
