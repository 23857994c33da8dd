import type { Knex } from 'knex'
import { measured } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('mode_records', (t) => {
    t.enum('sky_subtraction', ['around', 'paired', 'blank-sky'])
      .notNullable()
      .defaultTo('around')
      .comment('how the sky is taken off: from pixels around, from the next frame, from frames of blank sky')
    measured(t, 'background_pixels', 'pixels the sky around is measured from; unlimited when null')
    measured(t, 'thermal_e_per_s', 'glow of telescope and instrument, electrons a second a pixel')
      .notNullable()
      .defaultTo(0)
    measured(t, 'optics_arcsec', 'width of the image the optics alone make').notNullable().defaultTo(0)
    t.boolean('dispersion_corrected')
      .notNullable()
      .defaultTo(false)
      .comment('prisms undo the dispersion of the air')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('mode_records', (t) => {
    t.dropColumn('sky_subtraction')
    t.dropColumn('background_pixels')
    t.dropColumn('thermal_e_per_s')
    t.dropColumn('optics_arcsec')
    t.dropColumn('dispersion_corrected')
  })
}
