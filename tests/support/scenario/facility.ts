import type { Database } from '@/db/client'

export interface ScenarioFacility {
  siteId: number
  telescopeId: number
  instrumentId: number
  modeId: number
}

/** A site with one telescope, one optical spectrograph and one mode, with figures that can be computed with. */
export async function makeFacility(db: Database, tag: string): Promise<ScenarioFacility> {
  const [siteId = 0] = await db('sites').insert({ slug: `site-${tag}`, name: `Observatory ${tag}` })
  await db('site_records').insert({
    site_id: siteId,
    record_version: 1,
    valid_from: '2020-01-01',
    latitude_deg: -37.4,
    longitude_deg: -70.2,
    elevation_m: 2390,
    time_zone: 'Etc/GMT+3',
    utc_offset_hours: -3,
    lowest_altitude_deg: 20,
    extinction_mag_per_airmass: JSON.stringify({
      U: 0.48,
      B: 0.25,
      V: 0.13,
      R: 0.09,
      I: 0.05,
      g: 0.19,
      r: 0.1,
      i: 0.05,
      z: 0.04,
    }),
    dark_sky_mag_arcsec2: JSON.stringify({
      U: 22.9,
      B: 22.6,
      V: 21.8,
      R: 21.2,
      I: 20.3,
      g: 22.2,
      r: 21.3,
      i: 20.6,
      z: 19.6,
    }),
    seeing_arcsec: JSON.stringify({ best10: 0.6, median: 0.9, worst90: 1.5 }),
  })
  const [telescopeId = 0] = await db('telescopes').insert({
    site_id: siteId,
    slug: `telescope-${tag}`,
    name: `Telescope ${tag}`,
  })
  await db('telescope_records').insert({
    telescope_id: telescopeId,
    record_version: 1,
    valid_from: '2020-01-01',
    aperture_m: 3.8,
    collecting_area_m2: 10.2,
    highest_altitude_deg: null,
  })
  const [instrumentId = 0] = await db('instruments').insert({
    telescope_id: telescopeId,
    slug: `instrument-${tag}`,
    name: `INSTRUMENT ${tag}`,
    summary: 'optical long-slit spectrograph',
  })
  const [modeId = 0] = await db('instrument_modes').insert({
    instrument_id: instrumentId,
    slug: `mode-${tag}`,
    name: 'Red, 1.0″ slit',
  })
  await db('mode_records').insert({
    mode_id: modeId,
    record_version: 1,
    valid_from: '2020-01-01',
    kind: 'long-slit',
    wavelength_min_a: 5200,
    wavelength_max_a: 9600,
    medium: 'air',
    pixel_scale_arcsec: 0.25,
    dispersion_a_per_pixel: 1.2,
    slit_width_arcsec: 1,
    resolving_power: 1500,
    read_noise_e: 3.5,
    dark_e_per_s: 0.001,
    full_well_e: 150_000,
    gain_e_per_adu: 1.1,
    min_sub_exposure_s: 5,
    max_sub_exposure_s: 1800,
    systematic_floor: 0.002,
    twilight_limit_deg: -18,
    throughput: JSON.stringify([
      { wavelengthA: 5200, efficiency: 0.2 },
      { wavelengthA: 7000, efficiency: 0.28 },
      { wavelengthA: 9600, efficiency: 0.15 },
    ]),
    throughput_includes: JSON.stringify(['telescope']),
    overheads: JSON.stringify({ acquisitionS: 420, readoutS: 40, ditherS: 0, calibrationFraction: 0.05 }),
  })
  return { siteId, telescopeId, instrumentId, modeId }
}
