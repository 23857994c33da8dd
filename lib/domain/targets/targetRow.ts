import { TRUE_MINUS } from '@/lib/format'
import type { Target } from '../proposals/types'
import { bandChoice } from './bands'
import type { TargetRow } from './schema'
import { spectrumText } from './spectrumTable'

const text = (value: number | null | undefined) =>
  value === null || value === undefined ? '' : String(value).replace('-', TRUE_MINUS)

/** A row in which nothing has been typed yet. */
export const emptyTargetRow: TargetRow = {
  name: '',
  ra: '',
  dec: '',
  redshift: '',
  redshiftType: 'spectroscopic',
  redshiftError: '',
  redshiftFrame: 'heliocentric',
  magnitude: '',
  magnitudeError: '',
  band: 'r AB',
  provenance: 'observed',
  source: '',
  need: 'required',
  group: '',
  event: '',
  trigger: '',
  reaction: '',
  triggers: '',
  geometry: 'point',
  effectiveRadius: '',
  effectiveRadiusError: '',
  sersicIndex: '',
  ebv: '',
  magnification: '',
  magnificationError: '',
  lineName: '',
  lineKind: 'flux',
  lineValue: '',
  lineError: '',
  lineWidth: '',
  spectrum: 'flat',
  spectralIndex: '',
  spectralIndexError: '',
  temperature: '',
  spectrumTable: '',
  pmRa: '',
  pmDec: '',
  epoch: '2016',
}

function spectrumCells(spectrum: Target['spectrum'] | undefined) {
  const isLaw = spectrum?.kind === 'power-law'
  return {
    spectrum: spectrum?.kind ?? 'flat',
    spectralIndex: isLaw ? text(spectrum.index) : '',
    spectralIndexError: isLaw ? text(spectrum.indexError) : '',
    temperature: spectrum?.kind === 'black-body' ? text(spectrum.temperatureK) : '',
    spectrumTable: spectrum?.kind === 'table' ? spectrumText(spectrum) : '',
  } satisfies Partial<TargetRow>
}

/** A kept target as the text of its row: what was typed where that is kept, else the value written out. */
export function targetRow(target: Omit<Target, 'id' | 'version' | 'position'>): TargetRow {
  const { brightness, opportunity } = target
  return {
    name: target.name,
    ra: target.raTyped,
    dec: target.decTyped,
    redshift: target.redshiftTyped || text(target.redshift),
    redshiftType: target.redshiftType,
    redshiftError: text(target.redshiftError),
    redshiftFrame: target.redshiftFrame,
    magnitude: text(brightness?.value),
    magnitudeError: text(brightness?.error),
    band: brightness ? bandChoice(brightness.band, brightness.system) : emptyTargetRow.band,
    provenance: brightness?.provenance ?? 'observed',
    source: brightness?.source ?? '',
    need: target.need,
    group: target.group ?? '',
    event: opportunity?.event ?? '',
    trigger: opportunity?.trigger ?? '',
    reaction: opportunity ? text(Number((opportunity.reactionSeconds / 3600).toFixed(4))) : '',
    triggers: text(opportunity?.triggers),
    geometry: target.geometry,
    effectiveRadius: text(target.effectiveRadiusArcsec),
    effectiveRadiusError: text(target.effectiveRadiusErrorArcsec),
    sersicIndex: text(target.sersicIndex),
    ebv: text(target.galacticEbv),
    magnification: text(target.magnification),
    magnificationError: text(target.magnificationError),
    lineName: target.line?.name ?? '',
    lineKind: target.line?.kind ?? 'flux',
    lineValue: text(target.line?.value),
    lineError: text(target.line?.error),
    lineWidth: text(target.line?.widthKmS),
    ...spectrumCells(target.spectrum),
    pmRa: text(target.pmRaMasYr),
    pmDec: text(target.pmDecMasYr),
    epoch: text(target.epochYr),
  }
}
