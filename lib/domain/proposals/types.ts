import type { Call, CallKind } from '../calls/types'
import type { ModeRecord, SiteRecord } from '../facility/types'

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
  position: number
  confirmedAt: Date | null
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
  sersicIndex: number | null
  redshiftTyped: string
  redshift: number | null
  redshiftError: number | null
  redshiftFrame: 'heliocentric' | 'cmb'
  redshiftType: 'spectroscopic' | 'photometric' | 'assumed'
  need: 'required' | 'optional' | 'backup'
  brightness: Brightness | null
  line: LineLight | null
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

export interface Paper {
  id: number
  kind: 'justification' | 'team-expertise'
  fileName: string
  pages: number
  /** Words that can be read in it; null where they were not counted. */
  words: number | null
  sizeBytes: number
  sha256: string
  objectKey: string
  uploadedAt: Date
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
  targets: Target[]
  constraintSets: ConstraintSet[]
  observations: Observation[]
  papers: Paper[]
}
