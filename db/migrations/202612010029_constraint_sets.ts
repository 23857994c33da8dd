import type { Knex } from 'knex'
import { measured, reference, version } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('constraint_sets', (t) => {
    t.comment('Conditions asked for')
    t.increments('id').comment('key')
    reference(t, 'proposal_id', 'proposals', 'CASCADE', 'which proposal').notNullable()
    t.string('name', 120).notNullable().comment('name')
    measured(t, 'max_airmass', 'highest airmass').notNullable().defaultTo(1.8)
    measured(t, 'image_quality_arcsec', 'poorest delivered image, zenith and 500 nm')
      .notNullable()
      .defaultTo(1.2)
    t.enum('moon', ['dark', 'grey', 'any']).notNullable().defaultTo('any').comment('brightest Moon accepted')
    measured(t, 'min_moon_separation_deg', 'nearest Moon accepted').notNullable().defaultTo(30)
    t.enum('transparency', ['photometric', 'clear', 'thin-cloud'])
      .notNullable()
      .defaultTo('clear')
      .comment('poorest transparency accepted')
    measured(t, 'position_angle_deg', 'slit position angle, if it matters')
    t.date('date_from').comment('not before this evening')
    t.date('date_to').comment('not after this evening')
    t.string('cadence', 120).comment('cadence, if any')
    version(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('constraint_sets')
}
