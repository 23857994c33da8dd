import type { Knex } from 'knex'
import { createdAt, measured, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('site_records', (t) => {
    t.comment('Site facts, versioned by date; reports cite the version')
    t.increments('id').comment('key')
    reference(t, 'site_id', 'sites', 'RESTRICT', 'which site').notNullable()
    t.integer('record_version').unsigned().notNullable().comment('counts from 1')
    t.date('valid_from').notNullable().comment('first evening it holds for')
    measured(t, 'latitude_deg', 'geodetic latitude, north positive').notNullable()
    measured(t, 'longitude_deg', 'longitude, east positive').notNullable()
    measured(t, 'elevation_m', 'height above sea level').notNullable()
    t.string('time_zone', 60).notNullable().comment('IANA zone of the site')
    measured(t, 'utc_offset_hours', 'civil time minus UTC at the site, all year').notNullable()
    measured(t, 'lowest_altitude_deg', 'lowest altitude a telescope may point to').notNullable()
    t.json('extinction_mag_per_airmass').notNullable().comment('band -> magnitude an airmass')
    t.json('dark_sky_mag_arcsec2')
      .notNullable()
      .comment('band -> moonless sky at zenith, AB mag per square arcsec')
    t.json('seeing_arcsec').notNullable().comment('best10, median, worst90 at zenith and 500 nm')
    createdAt(t)
    t.unique(['site_id', 'record_version'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('site_records')
}
