import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('mode_records', (t) => {
    t.enum('read_noise_per', ['read', 'ramp'])
      .notNullable()
      .defaultTo('read')
      .comment('what the read noise is of: one read of the detector, or a whole ramp of them')
    t.string('filters', 200).notNullable().defaultTo('').comment('filters in the beam, in words')
    t.string('calibration_policy', 600)
      .notNullable()
      .defaultTo('')
      .comment('which calibrations the observatory takes, and on whose time')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('mode_records', (t) => {
    t.dropColumn('read_noise_per')
    t.dropColumn('filters')
    t.dropColumn('calibration_policy')
  })
}
