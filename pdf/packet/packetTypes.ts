import type { WrittenData } from '../writing/writtenData'
import type { FactRow } from '../parts/FactRows'
import type { PrintedVerdict } from '../parts/Verdict'

export interface PacketRow {
  /** Number of the target, on its first row only. */
  number: string
  name: string
  position: string
  redshift: string
  magnitude: string
  luminosityMpc: string
  kpcPerArcsec: string
  feature: string
  needed: string
  asked: string
  verdict: PrintedVerdict | null
}

export interface UpRow {
  name: string
  byNight: readonly number[]
  total: string
  tone: 'plain' | 'marginal' | 'not-feasible'
}

export interface UpChartData {
  note: string
  rows: readonly UpRow[]
  maxHours: number
  nights: number
  /** First night of each month, from 0, and its name. */
  months: readonly { night: number; name: string }[]
  moons: readonly { night: number; words: 'new' | 'full' }[]
}

/** Where the lines of the targets fall in the range of one mode; wavelengths observed, in vacuum, angstroms. */
export interface SpectrumChartData {
  modeName: string
  fromA: number
  toA: number
  mode: { fromA: number; toA: number }
  bands: readonly { name: string; fromA: number; toA: number; isHeavy: boolean }[]
  skyLinesA: readonly number[]
  rows: readonly SpectrumRow[]
}

/** One observation: the feature it asks for, and the other lines at its redshift. */
export interface SpectrumRow {
  name: string
  tone: PrintedVerdict
  lines: readonly { words: string; atA: number; isAsked: boolean }[]
}

/** A packet in words and numbers, ready to be set. */
export interface PacketData {
  observatory: string
  season: string
  /** Review number, reference, or what a draft is called. */
  label: string
  title: string
  abstract: string
  category: string
  /** Only in the variant with names. */
  people: readonly { name: string; institute: string }[]
  facts: readonly FactRow[]
  /** `J` over `AB`; `mag` where the targets differ. */
  magnitudeHead: { head: string; unit: string }
  rows: readonly PacketRow[]
  total: { words: string; needed: string; asked: string; verdict: PrintedVerdict | null }
  /** Under the table: how each group stands, what is awaited, what the brackets mean. */
  rules: readonly { name: string; text: string; verdict: PrintedVerdict | null }[]
  cosmology: string
  /** How magnitudes were carried from their bands to the instruments. */
  carried: readonly string[]
  up: UpChartData | null
  /** One for each mode with a slit that looks at a target with a redshift. */
  spectra: readonly SpectrumChartData[]
  notes: readonly { verdict: PrintedVerdict; words: string; text: string }[]
  /** The justification where it was written here; null where it is a document, or there is none. */
  written: WrittenData | null
}
