import type { Knex } from 'knex'
import { measured } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('targets', (t) => {
    measured(t, 'galactic_ebv', 'reddening E(B-V) of the Galaxy as read from the SFD map, magnitudes')
    measured(t, 'magnification', 'lensing magnification, applied to predicted brightness')
    measured(t, 'magnification_error', 'one-sigma error of the magnification')
  })
  await knex.schema.alterTable('target_quantities', (t) => {
    t.string('band', 40).comment('band of a magnitude, or name of a line').alter()
    measured(t, 'width_km_s', 'full width at half maximum of a line, km/s')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('target_quantities', (t) => {
    t.string('band', 12).comment('band').alter()
    t.dropColumn('width_km_s')
  })
  await knex.schema.alterTable('targets', (t) => {
    t.dropColumn('galactic_ebv')
    t.dropColumn('magnification')
    t.dropColumn('magnification_error')
  })
}
