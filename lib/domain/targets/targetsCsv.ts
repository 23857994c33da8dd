import { csvText } from '@/lib/format'
import type { TargetComputation } from '../observations/types'
import type { Target } from '../proposals/types'
import { targetRow } from './targetRow'

/** Heads that this product reads back, then what was computed, with units in the names. */
const heads = [
  'name',
  'ra',
  'dec',
  'epoch',
  'pmra',
  'pmdec',
  'z',
  'z_err',
  'z_type',
  'z_frame',
  'mag',
  'mag_err',
  'band',
  'provenance',
  'mag_source',
  'need',
  'shape',
  're',
  'sersic',
  'ebv',
  'magnification',
  'magnification_error',
  'line',
  'line_kind',
  'line_value',
  'line_error',
  'line_width',
  'ra_deg',
  'dec_deg',
  'luminosity_distance_mpc',
  'kpc_per_arcsec',
  'lookback_gyr',
  'distance_modulus_mag',
  'dark_hours',
  'cosmology',
]

/** The targets as a file: what was typed, and what it comes to under the cosmology named in the last column. */
export function targetsCsv(
  targets: readonly Target[],
  computed: readonly TargetComputation[],
  cosmologyName: string,
): string {
  const byId = new Map(computed.map((one) => [one.targetId, one]))
  const rows = targets.map((target) => {
    const row = targetRow(target)
    const numbers = byId.get(target.id)
    return [
      row.name,
      row.ra,
      row.dec,
      target.epochYr,
      target.pmRaMasYr,
      target.pmDecMasYr,
      target.redshift,
      target.redshiftError,
      row.redshiftType,
      row.redshiftFrame,
      target.brightness?.value,
      target.brightness?.error,
      target.brightness ? row.band : '',
      target.brightness ? row.provenance : '',
      row.source,
      row.need,
      row.geometry,
      target.effectiveRadiusArcsec,
      target.sersicIndex,
      target.galacticEbv,
      target.magnification,
      target.magnificationError,
      row.lineName,
      target.line ? row.lineKind : '',
      target.line?.value,
      target.line?.error,
      target.line?.widthKmS,
      target.raDeg,
      target.decDeg,
      numbers?.luminosityMpc,
      numbers?.kpcPerArcsec,
      numbers?.lookbackGyr,
      numbers?.distanceModulusMag,
      numbers?.visibleHours,
      cosmologyName,
    ]
  })
  return csvText(heads, rows)
}
