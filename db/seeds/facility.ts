import type { Database } from '../client.ts'
import { instruments, modes, site, telescopes, type SeedMode } from './facilityData.ts'

const validFrom = '2020-01-01'

async function insertId(db: Database, table: string, row: Record<string, unknown>): Promise<number> {
  const [id] = await db(table).insert(row)
  if (id === undefined) throw new Error(`${table} gave no key`)
  return id
}

function modeRecord(mode: SeedMode, modeId: number): Record<string, unknown> {
  const [blue, red] = mode.rangeA
  const [atBlue, atMiddle, atRed] = mode.efficiency
  return {
    mode_id: modeId,
    record_version: 1,
    valid_from: validFrom,
    kind: mode.kind,
    wavelength_min_a: blue,
    wavelength_max_a: red,
    medium: mode.medium,
    band: mode.band,
    pixel_scale_arcsec: mode.pixelScaleArcsec,
    dispersion_a_per_pixel: mode.dispersionAPerPixel,
    slit_width_arcsec: mode.slitWidthArcsec,
    resolving_power: mode.resolvingPower,
    read_noise_e: mode.readNoiseE,
    dark_e_per_s: mode.darkEPerS,
    full_well_e: mode.fullWellE,
    gain_e_per_adu: mode.gainEPerAdu,
    min_sub_exposure_s: mode.subExposureS[0],
    max_sub_exposure_s: mode.subExposureS[1],
    systematic_floor: mode.systematicFloor,
    twilight_limit_deg: mode.twilightLimitDeg,
    sky_subtraction: mode.skySubtraction ?? 'around',
    thermal_e_per_s: mode.thermalEPerS ?? 0,
    read_noise_per: mode.readNoisePer ?? 'read',
    filters: mode.filters ?? '',
    calibration_policy: mode.calibrationPolicy,
    throughput: JSON.stringify([
      { wavelengthA: blue, efficiency: atBlue },
      { wavelengthA: (blue + red) / 2, efficiency: atMiddle },
      { wavelengthA: red, efficiency: atRed },
    ]),
    throughput_includes: JSON.stringify([
      'telescope',
      'optics',
      mode.band ? 'filter' : 'grating',
      'detector',
    ]),
    overheads: JSON.stringify(mode.overheads),
  }
}

/** Describes the site, telescopes, instruments and modes; returns the keys by slug. */
export async function seedFacility(db: Database): Promise<{
  siteId: number
  telescopeIds: Map<string, number>
  instrumentIds: Map<string, number>
  modeIds: Map<string, number>
}> {
  const siteId = await insertId(db, 'sites', { slug: site.slug, name: site.name })
  await db('site_records').insert({
    site_id: siteId,
    record_version: 1,
    valid_from: validFrom,
    latitude_deg: site.latitude_deg,
    longitude_deg: site.longitude_deg,
    elevation_m: site.elevation_m,
    time_zone: site.time_zone,
    utc_offset_hours: site.utc_offset_hours,
    lowest_altitude_deg: site.lowest_altitude_deg,
    extinction_mag_per_airmass: JSON.stringify(site.extinction),
    dark_sky_mag_arcsec2: JSON.stringify(site.darkSky),
    seeing_arcsec: JSON.stringify(site.seeing),
    weather: JSON.stringify(site.weather),
  })

  const telescopeIds = new Map<string, number>()
  for (const telescope of telescopes) {
    const id = await insertId(db, 'telescopes', {
      site_id: siteId,
      slug: telescope.slug,
      name: telescope.name,
    })
    await db('telescope_records').insert({
      telescope_id: id,
      record_version: 1,
      valid_from: validFrom,
      aperture_m: telescope.aperture_m,
      collecting_area_m2: telescope.collecting_area_m2,
      horizon: JSON.stringify(telescope.horizon),
      highest_altitude_deg: telescope.highest_altitude_deg,
    })
    telescopeIds.set(telescope.slug, id)
  }

  const instrumentIds = new Map<string, number>()
  for (const { slug, name, telescope, summary } of instruments)
    instrumentIds.set(
      slug,
      await insertId(db, 'instruments', { telescope_id: telescopeIds.get(telescope), slug, name, summary }),
    )

  const modeIds = new Map<string, number>()
  for (const mode of modes) {
    const id = await insertId(db, 'instrument_modes', {
      instrument_id: instrumentIds.get(mode.instrument),
      slug: mode.slug,
      name: mode.name,
    })
    await db('mode_records').insert(modeRecord(mode, id) as never)
    modeIds.set(mode.slug, id)
  }
  return { siteId, telescopeIds, instrumentIds, modeIds }
}
