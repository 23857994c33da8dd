import type { Call, CallKind } from '../calls/types'
import type { ModeRecord, SiteRecord } from '../facility/types'
import type { Figure, Paper, Writings } from './writingTypes'

export type ProposalState =
  'draft' | 'submitted' | 'under-review' | 'awarded' | 'reserve' | 'declined' | 'withdrawn' | 'lapsed'

export interface Investigator {
  id: number
  personId: number | null
  name: string
  email: string
  institute: string
  role: 'pi' | 'co-investigator'
  access: 'read' | 'edit' | 'deputy'
  isStudent: boolean
  /** Supervises the student named. */
  isSupervisor: boolean
  /** With hyphens: '0000-0002-1825-0097'. The account's own, else as typed by whoever named them. */
  orcid: string | null
  /** The account has proved that the iD is its own. */
  isOrcidVerified: boolean
  position: number
  confirmedAt: Date | null
  /** Raised by every change of what is said of the person; rights and order are not counted. */
  version: number
}

export interface Brightness {
  value: number
  error: number | null
  system: 'AB' | 'Vega' | 'ST'
  band: string
  provenance: 'observed' | 'predicted'
  source: string
}

/** A line as measured, flux in erg/s/cm², or the luminosity in erg/s that predicts one. */
export interface LineLight {
  /** As in the list of rest lines: 'Hα'. */
  name: string
  kind: 'flux' | 'luminosity'
  value: number
  error: number | null
  /** Intrinsic full width at half maximum. */
  widthKmS: number
}

/** Shape of a target's own continuum, before dust and gas on the way. */
export type TargetSpectrum =
  | { kind: 'power-law'; index: number; indexError: number | null }
  | { kind: 'black-body'; temperatureK: number }
  | { kind: 'table'; wavelengthsNm: number[]; fLambda: number[] }

/** What is asked of a target that is awaited, not known. */
export interface Opportunity {
  /** Class of event: 'tidal disruption'. */
  event: string
  /** What must be seen for it to be observed. */
  trigger: string
  /** From the trigger to the first exposure. */
  reactionSeconds: number
  /** How many such events are asked for; hours are asked for each. */
  triggers: number
}

/** Targets that share one rule. */
export interface TargetGroup {
  id: number
  /** No two of a proposal are called the same. */
  name: string
  /** All of them must be done, at least so many, or they are used only when the others cannot be. */
  rule: 'all' | 'at-least' | 'backup'
  /** How many; null but for 'at-least'. */
  atLeast: number | null
  /** Whose hours are asked of an 'at-least' group: of all it lists, or of as many as must be done. */
  hoursFor: 'all' | 'at-least'
  version: number
}

export interface Target {
  id: number
  position: number
  name: string
  raTyped: string
  decTyped: string
  raDeg: number | null
  decDeg: number | null
  epochYr: number
  pmRaMasYr: number | null
  pmDecMasYr: number | null
  geometry: 'point' | 'sersic' | 'uniform'
  effectiveRadiusArcsec: number | null
  /** One sigma; null where none is stated. */
  effectiveRadiusErrorArcsec: number | null
  sersicIndex: number | null
  redshiftTyped: string
  redshift: number | null
  redshiftError: number | null
  redshiftFrame: 'heliocentric' | 'cmb'
  redshiftType: 'spectroscopic' | 'photometric' | 'assumed'
  /** How much it is needed by itself; in a group the group's rule counts instead. */
  need: 'required' | 'optional' | 'backup'
  /** Name of its group. */
  group: string | null
  /** What it waits for; null for a target that is there already. */
  opportunity: Opportunity | null
  brightness: Brightness | null
  line: LineLight | null
  /** Null where none is stated: flat in f_nu. */
  spectrum: TargetSpectrum | null
  /** Reddening of the Galaxy as read from the SFD map; what is predicted is dimmed by it. */
  galacticEbv: number | null
  /** What is predicted is made brighter by it. */
  magnification: number | null
  magnificationError: number | null
  version: number
}

export interface ConstraintSet {
  id: number
  name: string
  maxAirmass: number
  imageQualityArcsec: number
  moon: 'dark' | 'grey' | 'any'
  minMoonSeparationDeg: number
  transparency: 'photometric' | 'clear' | 'thin-cloud'
  dateFrom: string | null
  dateTo: string | null
  /** How often it is repeated, in words: `every 4 to 6 nights, ten times`; null for once. */
  cadence: string | null
  version: number
}

export interface Observation {
  id: number
  position: number
  targetId: number
  modeId: number
  constraintSetId: number
  wantedSnr: number
  snrPer: 'image' | 'pixel' | 'angstrom' | 'resolution-element'
  feature: string | null
  featureRestA: number | null
  askedSeconds: number
  version: number
}

/** The nights of a visit: how many, which half of each or the whole, and whether they follow one another. */
export interface VisitWish {
  nights: number
  part: 'whole' | 'first' | 'second'
  together: boolean
}

/** How time on an instrument is wished for. */
export interface ServiceWish {
  id: number
  instrumentId: number
  /** Least award that is of use; null for half of what is asked. */
  leastSeconds: number | null
  /** Null where observatory staff are to observe, in the queue. */
  visit: VisitWish | null
  version: number
}

export interface ChosenCosmology {
  /** A preset's id, or 'custom'. */
  id: string
  parameters: {
    name: string
    H0: number
    Om0: number
    Ode0: number | 'flat'
    w0: number
    wa: number
    Tcmb0: number
    Neff: number
    mNuEv: number[]
  }
  /** A preset shown beside it, or null. */
  comparisonId: string | null
}

/** Everything a proposal says, as it stands now: what pages show, what is computed from, what is frozen on sending. */
export interface ProposalContents {
  id: number
  reference: string
  reviewNumber: string | null
  state: ProposalState
  isReopened: boolean
  version: number
  updatedAt: Date
  closesAt: Date | null
  title: string
  abstract: string
  category: string
  cosmology: ChosenCosmology
  /** Sections the author calls done. */
  sectionsDone: string[]
  call: Call
  kind: CallKind
  site: SiteRecord
  /** Modes on offer in the call. */
  modes: ModeRecord[]
  people: Investigator[]
  groups: TargetGroup[]
  targets: Target[]
  constraintSets: ConstraintSet[]
  observations: Observation[]
  /** None for an instrument of which nothing is said. */
  wishes: ServiceWish[]
  papers: Paper[]
  writings: Writings
  figures: Figure[]
}
