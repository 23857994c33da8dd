import type { Knex } from 'knex'
import { measured } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('targets', (t) => {
    t.enum('spectrum_kind', ['power-law', 'black-body', 'table']).comment(
      'shape of the continuum before dust and gas; null where none is stated',
    )
    measured(t, 'spectral_index', 'index alpha of a power law f_nu ~ nu^alpha')
    measured(t, 'spectral_index_error', 'one-sigma error of the index')
    measured(t, 'temperature_k', 'temperature of a black body at rest with the source, kelvin')
    t.text('spectrum_table').comment(
      'rows of wavelength at rest, nm, and f_lambda in any unit, between semicolons',
    )
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('targets', (t) => {
    t.dropColumn('spectrum_kind')
    t.dropColumn('spectral_index')
    t.dropColumn('spectral_index_error')
    t.dropColumn('temperature_k')
    t.dropColumn('spectrum_table')
  })
}
