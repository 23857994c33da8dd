import type { Knex } from 'knex'
import { createdAt, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('facility_retirements', (t) => {
    t.comment('Sites, telescopes, instruments and modes that calls no longer offer from an evening on')
    t.increments('id').comment('key')
    reference(t, 'site_id', 'sites', 'RESTRICT', 'the site, with all it carries').unique()
    reference(t, 'telescope_id', 'telescopes', 'RESTRICT', 'or the telescope, with its instruments').unique()
    reference(t, 'instrument_id', 'instruments', 'RESTRICT', 'or the instrument, with its modes').unique()
    reference(t, 'mode_id', 'instrument_modes', 'RESTRICT', 'or the mode alone').unique()
    t.date('retired_from').notNullable().comment('first evening it is no longer there')
    createdAt(t)
    t.check(
      '(site_id IS NOT NULL) + (telescope_id IS NOT NULL) + (instrument_id IS NOT NULL) + (mode_id IS NOT NULL) = 1',
      [],
      'facility_retirements_of_one',
    )
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('facility_retirements')
}
