import type { Knex } from 'knex'
import { exactText, measured, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('target_quantities', (t) => {
    t.comment('Measured or predicted brightness and size of a target')
    t.increments('id').comment('key')
    reference(t, 'target_id', 'targets', 'CASCADE', 'which target').notNullable()
    t.enum('quantity', ['magnitude', 'line-flux', 'luminosity', 'size']).notNullable().comment('what it is')
    measured(t, 'value', 'value in the unit named').notNullable()
    measured(t, 'error', 'one-sigma error, same unit')
    t.string('unit', 30).notNullable().comment('unit, VOUnit spelling')
    t.enum('magnitude_system', ['AB', 'Vega', 'ST']).comment('magnitude system')
    t.string('band', 12).comment('band')
    t.enum('provenance', ['observed', 'predicted'])
      .notNullable()
      .defaultTo('observed')
      .comment('observed, or predicted from a luminosity')
    exactText(t, 'reference_cosmology_id', 40, 'cosmology a luminosity was derived under')
    t.boolean('dust_corrected').notNullable().defaultTo(false).comment('corrected for dust')
    measured(t, 'magnification', 'lensing magnification already in the value')
    t.string('source', 240).notNullable().defaultTo('').comment('where the value comes from')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('target_quantities')
}
