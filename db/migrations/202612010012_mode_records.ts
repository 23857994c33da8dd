import type { Knex } from 'knex'
import { createdAt, measured, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('mode_records', (t) => {
    t.comment('Instrument-mode facts, versioned by date; an exposure cites the version it used')
    t.increments('id').comment('key')
    reference(t, 'mode_id', 'instrument_modes', 'RESTRICT', 'which mode').notNullable()
    t.integer('record_version').unsigned().notNullable().comment('counts from 1')
    t.date('valid_from').notNullable().comment('first evening it holds for')
    t.enum('kind', ['imaging', 'long-slit']).notNullable().comment('imaging or long-slit spectroscopy')
    measured(t, 'wavelength_min_a', 'blue end of the range, angstrom').notNullable()
    measured(t, 'wavelength_max_a', 'red end of the range, angstrom').notNullable()
    t.enum('medium', ['air', 'vacuum']).notNullable().comment('how the instrument quotes wavelengths')
    t.string('band', 8).comment('photometric band, imaging modes')
    measured(t, 'pixel_scale_arcsec', 'arcsec a pixel').notNullable()
    measured(t, 'dispersion_a_per_pixel', 'angstrom a pixel, spectroscopy')
    measured(t, 'slit_width_arcsec', 'slit width, spectroscopy')
    measured(t, 'resolving_power', 'lambda over delta lambda, spectroscopy')
    measured(t, 'read_noise_e', 'electrons a read (per ramp in the near infrared)').notNullable()
    measured(t, 'dark_e_per_s', 'electrons a second a pixel').notNullable()
    measured(t, 'full_well_e', 'electrons before the response bends').notNullable()
    measured(t, 'gain_e_per_adu', 'electrons a count').notNullable()
    measured(t, 'min_sub_exposure_s', 'shortest sub-exposure').notNullable()
    measured(t, 'max_sub_exposure_s', 'longest sub-exposure').notNullable()
    measured(t, 'systematic_floor', 'residual sky, as a fraction').notNullable()
    measured(t, 'twilight_limit_deg', 'Sun altitude below which the mode may work').notNullable()
    t.json('throughput').notNullable().comment('rows of wavelengthA, efficiency')
    t.json('throughput_includes')
      .notNullable()
      .comment('what the efficiency includes: atmosphere, telescope, slit')
    t.json('overheads').notNullable().comment('acquisitionS, readoutS, ditherS, calibrationFraction')
    createdAt(t)
    t.unique(['mode_id', 'record_version'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('mode_records')
}
