import type {
  ModeFacts,
  ModeRecord,
  SiteFacts,
  SiteRecord,
  TelescopeFacts,
} from '@/lib/domain/facility/types'
import type { Database } from '../client.ts'
import { retiredIds } from './retirements.ts'
import type {
  InstrumentModesRow,
  InstrumentsRow,
  ModeRecordsRow,
  SiteRecordsRow,
  TelescopeRecordsRow,
  TelescopesRow,
} from '../tables.ts'

const parsed = <T>(json: string): T => JSON.parse(json) as T

/** What a row of a site's record says. */
export function siteFactsOf(row: SiteRecordsRow): SiteFacts {
  return {
    latitudeDeg: row.latitude_deg,
    longitudeDeg: row.longitude_deg,
    elevationM: row.elevation_m,
    timeZone: row.time_zone,
    utcOffsetHours: row.utc_offset_hours,
    lowestAltitudeDeg: row.lowest_altitude_deg,
    horizon: parsed(row.horizon),
    extinctionMagPerAirmass: parsed(row.extinction_mag_per_airmass),
    darkSkyMagArcsec2: parsed(row.dark_sky_mag_arcsec2),
    seeingArcsec: parsed(row.seeing_arcsec),
    weather: row.weather === null ? null : parsed(row.weather),
  }
}

function siteOf(row: SiteRecordsRow & { name: string }): SiteRecord {
  return {
    siteId: row.site_id,
    name: row.name,
    recordVersion: row.record_version,
    ...siteFactsOf(row),
  }
}

/** The site's record in force on a date: the highest version whose validity has begun. */
export async function siteRecordAt(db: Database, siteId: number, onDate: string): Promise<SiteRecord> {
  const row = await db('site_records as r')
    .join('sites as s', 's.id', 'r.site_id')
    .where('r.site_id', siteId)
    .andWhere('r.valid_from', '<=', onDate)
    .orderBy('r.record_version', 'desc')
    .first<(SiteRecordsRow & { name: string }) | undefined>('r.*', 's.name')
  if (!row) throw new Error(`site ${siteId} has no record for ${onDate}`)
  return siteOf(row)
}

type ModeRow = ModeRecordsRow & {
  mode_slug: InstrumentModesRow['slug']
  mode_name: InstrumentModesRow['name']
  instrument_id: InstrumentsRow['id']
  instrument_slug: string
  instrument_name: string
  telescope_id: TelescopesRow['id']
  telescope_slug: string
  telescope_name: string
}

/** What a row of a mode's record says. */
export function modeFactsOf(row: ModeRecordsRow): ModeFacts {
  return {
    kind: row.kind,
    wavelengthMinA: row.wavelength_min_a,
    wavelengthMaxA: row.wavelength_max_a,
    medium: row.medium,
    band: row.band,
    pixelScaleArcsec: row.pixel_scale_arcsec,
    dispersionAPerPixel: row.dispersion_a_per_pixel,
    slitWidthArcsec: row.slit_width_arcsec,
    resolvingPower: row.resolving_power,
    readNoiseE: row.read_noise_e,
    readNoisePer: row.read_noise_per,
    darkEPerS: row.dark_e_per_s,
    fullWellE: row.full_well_e,
    gainEPerAdu: row.gain_e_per_adu,
    minSubExposureS: row.min_sub_exposure_s,
    maxSubExposureS: row.max_sub_exposure_s,
    systematicFloor: row.systematic_floor,
    twilightLimitDeg: row.twilight_limit_deg,
    skySubtraction: row.sky_subtraction,
    backgroundPixels: row.background_pixels,
    thermalEPerS: row.thermal_e_per_s,
    opticsArcsec: row.optics_arcsec,
    dispersionCorrected: row.dispersion_corrected === 1,
    filters: row.filters,
    calibrationPolicy: row.calibration_policy,
    throughput: parsed(row.throughput),
    throughputIncludes: parsed(row.throughput_includes),
    overheads: parsed(row.overheads),
  }
}

/** What a row of a telescope's record says. */
export function telescopeFactsOf(row: TelescopeRecordsRow): TelescopeFacts {
  return {
    apertureM: row.aperture_m,
    collectingAreaM2: row.collecting_area_m2,
    horizon: parsed(row.horizon),
    highestAltitudeDeg: row.highest_altitude_deg,
  }
}

function modeOf(row: ModeRow, telescope: TelescopeRecordsRow): ModeRecord {
  return {
    modeId: row.mode_id,
    slug: row.mode_slug,
    name: row.mode_name,
    recordVersion: row.record_version,
    instrument: { id: row.instrument_id, slug: row.instrument_slug, name: row.instrument_name },
    telescope: {
      id: row.telescope_id,
      slug: row.telescope_slug,
      name: row.telescope_name,
      recordVersion: telescope.record_version,
      ...telescopeFactsOf(telescope),
    },
    ...modeFactsOf(row),
  }
}

/** The last row of each key, rows being ordered by version. */
const latestBy = <Row>(rows: readonly Row[], key: (row: Row) => number): Map<number, Row> =>
  new Map(rows.map((row) => [key(row), row]))

/** Modes on offer in a call as their records stood on a date, in order of telescope, instrument and mode. */
export function modeRecordsOnOffer(db: Database, callId: number, onDate: string): Promise<ModeRecord[]> {
  return modeRecordsAt(db, onDate, callId)
}

/** Every mode of the observatory not retired, as its record stood on a date; with a call, those on offer in it. */
export async function modeRecordsAt(
  db: Database,
  onDate: string,
  callId: number | null,
): Promise<ModeRecord[]> {
  const rows = await db('instrument_modes as m')
    .join('instruments as i', 'i.id', 'm.instrument_id')
    .join('telescopes as t', 't.id', 'i.telescope_id')
    .join('mode_records as r', 'r.mode_id', 'm.id')
    .where('r.valid_from', '<=', onDate)
    .modify((q) => {
      if (callId === null) void q.whereNotIn('m.id', retiredIds(db, 'mode', onDate))
      else void q.whereIn('m.id', db('call_modes').where({ call_id: callId }).select('mode_id'))
    })
    .orderBy(['t.id', 'i.id', 'm.id', 'r.record_version'])
    .select<ModeRow[]>('r.*', {
      mode_slug: 'm.slug',
      mode_name: 'm.name',
      instrument_id: 'i.id',
      instrument_slug: 'i.slug',
      instrument_name: 'i.name',
      telescope_id: 't.id',
      telescope_slug: 't.slug',
      telescope_name: 't.name',
    })
  const latest = [...latestBy(rows, (row) => row.mode_id).values()]
  const telescopes = await telescopeRecordsAt(db, onDate, [...new Set(latest.map((row) => row.telescope_id))])
  return latest.flatMap((row) => {
    const telescope = telescopes.get(row.telescope_id)
    return telescope ? [modeOf(row, telescope)] : []
  })
}

/** Every site not retired that has a record in force on a date, with it. */
export async function siteRecordsAt(db: Database, onDate: string): Promise<SiteRecord[]> {
  const begun = db('site_records').where('valid_from', '<=', onDate).select('site_id')
  const sites = await db('sites')
    .whereIn('id', begun)
    .whereNotIn('id', retiredIds(db, 'site', onDate))
    .orderBy('id')
    .select('id')
  return Promise.all(sites.map(({ id }) => siteRecordAt(db, id, onDate)))
}

/** The record of each telescope in force on a date, by telescope. */
async function telescopeRecordsAt(db: Database, onDate: string, ids: readonly number[]) {
  const rows = await db('telescope_records')
    .whereIn('telescope_id', ids)
    .andWhere('valid_from', '<=', onDate)
    .orderBy('record_version')
  return latestBy(rows, (row) => row.telescope_id)
}

/** Every telescope not retired with the site it stands on and its record in force on a date. */
export async function telescopesAtSites(
  db: Database,
  onDate: string,
): Promise<{ id: number; siteId: number; slug: string; name: string; facts: TelescopeFacts }[]> {
  const rows = await db('telescopes')
    .whereNotIn('id', retiredIds(db, 'telescope', onDate))
    .orderBy('id')
    .select<TelescopesRow[]>('*')
  const records = await telescopeRecordsAt(
    db,
    onDate,
    rows.map(({ id }) => id),
  )
  return rows.flatMap(({ id, site_id: siteId, slug, name }) => {
    const record = records.get(id)
    return record ? [{ id, siteId, slug, name, facts: telescopeFactsOf(record) }] : []
  })
}
