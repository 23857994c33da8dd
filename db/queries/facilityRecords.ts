import type { ModeFacts, RecordVersion, SiteFacts, TelescopeFacts } from '../../lib/domain/facility/types.ts'
import type { Database } from '../client.ts'
import type { ModeRecordsRow, SiteRecordsRow, TelescopeRecordsRow } from '../tables.ts'
import { modeFactsOf, siteFactsOf, telescopeFactsOf } from './facility.ts'

/** What a record is of; the logbook knows a version as `<kind> record`, `<key>.<version>`. */
export type RecordKind = 'site' | 'telescope' | 'mode'

interface RecordRow {
  record_version: number
  valid_from: string
  created_at: Date
}

/** Who wrote each version of a record, by version; told by the logbook. */
async function writersOf(db: Database, kind: RecordKind, ownerId: number): Promise<Map<number, string>> {
  const rows = await db('logbook as l')
    .join('people as p', 'p.id', 'l.person_id')
    .where('l.subject_kind', `${kind} record`)
    .andWhere('l.subject_id', 'like', `${ownerId}.%`)
    .select<{ subject_id: string; name: string }[]>('l.subject_id', 'p.name')
  return new Map(rows.map((row) => [Number(row.subject_id.split('.')[1]), row.name]))
}

async function versionsOf<Row extends RecordRow, Facts>(
  db: Database,
  rows: readonly Row[],
  owner: { kind: RecordKind; id: number },
  factsOf: (row: Row) => Facts,
): Promise<RecordVersion<Facts>[]> {
  const writers = await writersOf(db, owner.kind, owner.id)
  return rows.map((row) => ({
    recordVersion: row.record_version,
    validFrom: row.valid_from,
    savedAt: row.created_at,
    savedBy: writers.get(row.record_version) ?? null,
    facts: factsOf(row),
  }))
}

/** The earliest evening any version of a record begins on, of every site, telescope or mode, by key. */
export async function firstEvenings(db: Database, kind: RecordKind): Promise<Map<number, string>> {
  const key = `${kind}_id`
  const rows = (await db(`${kind}_records`)
    .groupBy(key)
    .select({ id: key })
    .min({ begins_on: 'valid_from' })) as { id: number; begins_on: string }[]
  return new Map(rows.map((row) => [row.id, row.begins_on]))
}

/** Every version of a site's record, the newest first. */
export async function siteVersions(db: Database, siteId: number): Promise<RecordVersion<SiteFacts>[]> {
  const rows = await db('site_records').where({ site_id: siteId }).orderBy('record_version', 'desc')
  return versionsOf<SiteRecordsRow, SiteFacts>(db, rows, { kind: 'site', id: siteId }, siteFactsOf)
}

/** Every version of a telescope's record, the newest first. */
export async function telescopeVersions(
  db: Database,
  telescopeId: number,
): Promise<RecordVersion<TelescopeFacts>[]> {
  const rows = await db('telescope_records')
    .where({ telescope_id: telescopeId })
    .orderBy('record_version', 'desc')
  return versionsOf<TelescopeRecordsRow, TelescopeFacts>(
    db,
    rows,
    { kind: 'telescope', id: telescopeId },
    telescopeFactsOf,
  )
}

/** Every version of a mode's record, the newest first. */
export async function modeVersions(db: Database, modeId: number): Promise<RecordVersion<ModeFacts>[]> {
  const rows = await db('mode_records').where({ mode_id: modeId }).orderBy('record_version', 'desc')
  return versionsOf<ModeRecordsRow, ModeFacts>(db, rows, { kind: 'mode', id: modeId }, modeFactsOf)
}

export async function insertSiteRecord(
  db: Database,
  siteId: number,
  version: Pick<RecordVersion<SiteFacts>, 'recordVersion' | 'validFrom' | 'facts'>,
): Promise<void> {
  const { facts } = version
  await db('site_records').insert({
    site_id: siteId,
    record_version: version.recordVersion,
    valid_from: version.validFrom,
    latitude_deg: facts.latitudeDeg,
    longitude_deg: facts.longitudeDeg,
    elevation_m: facts.elevationM,
    time_zone: facts.timeZone,
    utc_offset_hours: facts.utcOffsetHours,
    lowest_altitude_deg: facts.lowestAltitudeDeg,
    horizon: JSON.stringify(facts.horizon),
    extinction_mag_per_airmass: JSON.stringify(facts.extinctionMagPerAirmass),
    dark_sky_mag_arcsec2: JSON.stringify(facts.darkSkyMagArcsec2),
    seeing_arcsec: JSON.stringify(facts.seeingArcsec),
    weather: facts.weather ? JSON.stringify(facts.weather) : null,
  })
}

export async function insertTelescopeRecord(
  db: Database,
  telescopeId: number,
  version: Pick<RecordVersion<TelescopeFacts>, 'recordVersion' | 'validFrom' | 'facts'>,
): Promise<void> {
  await db('telescope_records').insert({
    telescope_id: telescopeId,
    record_version: version.recordVersion,
    valid_from: version.validFrom,
    aperture_m: version.facts.apertureM,
    collecting_area_m2: version.facts.collectingAreaM2,
    horizon: JSON.stringify(version.facts.horizon),
    highest_altitude_deg: version.facts.highestAltitudeDeg,
  })
}

export async function insertModeRecord(
  db: Database,
  modeId: number,
  version: Pick<RecordVersion<ModeFacts>, 'recordVersion' | 'validFrom' | 'facts'>,
): Promise<void> {
  const { facts } = version
  await db('mode_records').insert({
    mode_id: modeId,
    record_version: version.recordVersion,
    valid_from: version.validFrom,
    kind: facts.kind,
    wavelength_min_a: facts.wavelengthMinA,
    wavelength_max_a: facts.wavelengthMaxA,
    medium: facts.medium,
    band: facts.band,
    pixel_scale_arcsec: facts.pixelScaleArcsec,
    dispersion_a_per_pixel: facts.dispersionAPerPixel,
    slit_width_arcsec: facts.slitWidthArcsec,
    resolving_power: facts.resolvingPower,
    read_noise_e: facts.readNoiseE,
    read_noise_per: facts.readNoisePer,
    dark_e_per_s: facts.darkEPerS,
    full_well_e: facts.fullWellE,
    gain_e_per_adu: facts.gainEPerAdu,
    min_sub_exposure_s: facts.minSubExposureS,
    max_sub_exposure_s: facts.maxSubExposureS,
    systematic_floor: facts.systematicFloor,
    twilight_limit_deg: facts.twilightLimitDeg,
    sky_subtraction: facts.skySubtraction,
    background_pixels: facts.backgroundPixels,
    thermal_e_per_s: facts.thermalEPerS,
    optics_arcsec: facts.opticsArcsec,
    dispersion_corrected: facts.dispersionCorrected ? 1 : 0,
    filters: facts.filters,
    calibration_policy: facts.calibrationPolicy,
    throughput: JSON.stringify(facts.throughput),
    throughput_includes: JSON.stringify(facts.throughputIncludes),
    overheads: JSON.stringify(facts.overheads),
  })
}
