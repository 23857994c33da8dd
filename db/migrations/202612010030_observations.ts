import type { Knex } from 'knex'
import { createdAt, measured, reference, version } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('observations', (t) => {
    t.comment('A target with an instrument mode, the depth wanted and the time asked')
    t.increments('id').comment('key')
    reference(t, 'proposal_id', 'proposals', 'CASCADE', 'which proposal').notNullable()
    reference(t, 'target_id', 'targets', 'CASCADE', 'which target').notNullable()
    reference(t, 'mode_id', 'instrument_modes', 'RESTRICT', 'which mode').notNullable()
    reference(t, 'constraint_set_id', 'constraint_sets', 'RESTRICT', 'conditions').notNullable()
    t.integer('position').unsigned().notNullable().comment('order')
    measured(t, 'wanted_snr', 'signal-to-noise wanted').notNullable()
    t.enum('snr_per', ['image', 'pixel', 'angstrom', 'resolution-element'])
      .notNullable()
      .comment('what the signal-to-noise is per')
    t.string('feature', 40).comment('feature to be measured')
    measured(t, 'feature_rest_a', 'its rest wavelength in vacuum, angstrom')
    t.integer('asked_seconds').unsigned().notNullable().comment('time asked, overheads included, seconds')
    version(t)
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('observations')
}
