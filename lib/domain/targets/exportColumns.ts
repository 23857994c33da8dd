import type { TargetComputation } from '../observations/types'
import type { Target } from '../proposals/types'
import type { TargetRow } from './schema'

export interface ExportedTarget {
  target: Target
  /** What was typed. */
  row: TargetRow
  numbers: TargetComputation | undefined
  cosmologyName: string
}

export interface ExportColumn {
  name: string
  kind: 'text' | 'number'
  /** In the grammar of VOUnits 1.0; empty for a pure number and for text. */
  unit: string
  ucd: string
  description: string
  value: (one: ExportedTarget) => string | number | null | undefined
}

type Value = ExportColumn['value']

const text = (name: string, ucd: string, description: string, value: Value): ExportColumn => ({
  ...{ name, kind: 'text', unit: '', ucd, description, value },
})
const number = (
  name: string,
  unit: string,
  ucd: string,
  description: string,
  value: Value,
): ExportColumn => ({
  ...{ name, kind: 'number', unit, ucd, description, value },
})

/** What was typed as a number stays as it was typed: 0.1580. */
const asTyped = (typed: string, value: number | null) => (/^\d+(\.\d+)?$/.test(typed) ? typed : value)

const flux = 'erg.s**-1.cm**-2'
const lineOf =
  (kind: 'flux' | 'luminosity', what: 'value' | 'error'): Value =>
  ({ target }) =>
    target.line?.kind === kind ? target.line[what] : null

const powerLaw =
  (what: 'index' | 'indexError'): Value =>
  ({ target }) =>
    target.spectrum?.kind === 'power-law' ? target.spectrum[what] : null

/** What was typed; this product reads these names back. */
const typed: readonly ExportColumn[] = [
  text('name', 'meta.id;meta.main', 'Name of the target', ({ row }) => row.name),
  text(
    'ra',
    'pos.eq.ra',
    'Right ascension as typed, ICRS: hours, or degrees when one number',
    ({ row }) => row.ra,
  ),
  text('dec', 'pos.eq.dec', 'Declination as typed, ICRS, degrees', ({ row }) => row.dec),
  number('epoch', 'yr', 'time.epoch', 'Epoch of the position, Julian year', ({ target }) => target.epochYr),
  number(
    'pmra',
    'mas.yr**-1',
    'pos.pm;pos.eq.ra',
    'Proper motion in right ascension, with cos(dec)',
    ({ target }) => target.pmRaMasYr,
  ),
  number(
    'pmdec',
    'mas.yr**-1',
    'pos.pm;pos.eq.dec',
    'Proper motion in declination',
    ({ target }) => target.pmDecMasYr,
  ),
  number('z', '', 'src.redshift', 'Redshift', ({ target }) => asTyped(target.redshiftTyped, target.redshift)),
  number(
    'z_err',
    '',
    'stat.error;src.redshift',
    'Error of the redshift',
    ({ target }) => target.redshiftError,
  ),
  text('z_type', '', 'spectroscopic, photometric or assumed', ({ row }) => row.redshiftType),
  text('z_frame', '', 'Frame of the redshift: heliocentric or cmb', ({ row }) => row.redshiftFrame),
  number('mag', 'mag', 'phot.mag', 'Apparent magnitude', ({ target }) => target.brightness?.value),
  number(
    'mag_err',
    'mag',
    'stat.error;phot.mag',
    'Error of the magnitude',
    ({ target }) => target.brightness?.error,
  ),
  text('band', 'instr.bandpass', 'Band and system of the magnitude', ({ target, row }) =>
    target.brightness ? row.band : '',
  ),
  text('provenance', '', 'Whether the magnitude was observed or predicted', ({ target, row }) =>
    target.brightness ? row.provenance : '',
  ),
  text('mag_source', 'meta.ref', 'Where the magnitude is from', ({ row }) => row.source),
  text(
    'spectrum',
    '',
    'Shape of the spectrum before dust and gas: power-law, black-body or table',
    ({ target }) => target.spectrum?.kind,
  ),
  number('spectral_index', '', 'spect.index', 'Index alpha of f_nu ~ nu^alpha', powerLaw('index')),
  number('spectral_index_error', '', 'stat.error;spect.index', 'Error of the index', powerLaw('indexError')),
  number('black_body_temperature', 'K', 'phys.temperature', 'Temperature of a black body', ({ target }) =>
    target.spectrum?.kind === 'black-body' ? target.spectrum.temperatureK : null,
  ),
  text(
    'spectrum_table',
    '',
    'Wavelength at rest in nm and f_lambda in any unit, a row between semicolons',
    ({ row }) => row.spectrumTable,
  ),
  text('need', '', 'required, optional or backup', ({ row }) => row.need),
  text('group', '', 'Name of the group of targets it stands in', ({ row }) => row.group),
  text('event', '', 'Class of event, of a target of opportunity', ({ row }) => row.event),
  text('trigger', '', 'What triggers its observation', ({ row }) => row.trigger),
  number('reaction', 'h', 'time.duration', 'Time from the trigger to the first exposure', ({ target }) =>
    target.opportunity ? target.opportunity.reactionSeconds / 3600 : null,
  ),
  number(
    'triggers',
    '',
    'meta.number',
    'Number of triggers asked for',
    ({ target }) => target.opportunity?.triggers,
  ),
  text('shape', '', 'point, sersic or uniform', ({ row }) => row.geometry),
  number('re', 'arcsec', 'phys.angSize', 'Half-light radius', ({ target }) => target.effectiveRadiusArcsec),
  number(
    're_err',
    'arcsec',
    'stat.error;phys.angSize',
    'Error of the half-light radius',
    ({ target }) => target.effectiveRadiusErrorArcsec,
  ),
  number('sersic', '', 'src.morph.param', 'Index of the Sersic profile', ({ target }) => target.sersicIndex),
  number(
    'ebv',
    'mag',
    'phot.color.excess',
    'Reddening E(B-V) of the Galaxy',
    ({ target }) => target.galacticEbv,
  ),
  number(
    'magnification',
    '',
    'arith.factor',
    'Magnification by a lens',
    ({ target }) => target.magnification,
  ),
  number(
    'magnification_error',
    '',
    'stat.error',
    'Error of the magnification',
    ({ target }) => target.magnificationError,
  ),
  text('line', 'meta.id;spect.line', 'Name of the spectral line', ({ row }) => row.lineName),
  number('line_flux', flux, 'phot.flux;spect.line', 'Flux of the line', lineOf('flux', 'value')),
  number(
    'line_flux_error',
    flux,
    'stat.error;phot.flux;spect.line',
    'Error of the flux',
    lineOf('flux', 'error'),
  ),
  number(
    'line_luminosity',
    'erg.s**-1',
    'phys.luminosity;spect.line',
    'Luminosity of the line',
    lineOf('luminosity', 'value'),
  ),
  number(
    'line_luminosity_error',
    'erg.s**-1',
    'stat.error;phys.luminosity;spect.line',
    'Error of the luminosity',
    lineOf('luminosity', 'error'),
  ),
  number(
    'line_width',
    'km.s**-1',
    'spect.line.width',
    'Full width of the line at half maximum',
    ({ target }) => target.line?.widthKmS,
  ),
]

/** What it comes to, under the cosmology named in the last column. */
const computed: readonly ExportColumn[] = [
  number('ra_deg', 'deg', 'pos.eq.ra;meta.main', 'Right ascension, ICRS', ({ target }) => target.raDeg),
  number('dec_deg', 'deg', 'pos.eq.dec;meta.main', 'Declination, ICRS', ({ target }) => target.decDeg),
  number(
    'luminosity_distance_mpc',
    'Mpc',
    'pos.distance',
    'Luminosity distance',
    ({ numbers }) => numbers?.luminosityMpc,
  ),
  number(
    'kpc_per_arcsec',
    'kpc.arcsec**-1',
    '',
    'Proper length across the line of sight',
    ({ numbers }) => numbers?.kpcPerArcsec,
  ),
  number('lookback_gyr', 'Gyr', 'time.age', 'Lookback time', ({ numbers }) => numbers?.lookbackGyr),
  number(
    'distance_modulus_mag',
    'mag',
    'phot.mag.distMod',
    'Distance modulus',
    ({ numbers }) => numbers?.distanceModulusMag,
  ),
  number(
    'dark_hours',
    'h',
    'time.duration;obs',
    'Dark hours in the season',
    ({ numbers }) => numbers?.visibleHours,
  ),
  text('cosmology', '', 'The cosmology of what is computed', ({ cosmologyName }) => cosmologyName),
]

/** The columns of a file of targets, the same in every format. */
export const exportColumns: readonly ExportColumn[] = [...typed, ...computed]
