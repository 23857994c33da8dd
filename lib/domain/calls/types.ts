import type { FeeRate } from '@/db/queries/feeRates'
import type { SeasonGrid } from '@/lib/science/sky'

export type { FeeRate }

/** Where a call stands: planned, open and closed by the clock, the rest by acts of the office and the chair. */
export type CallPhase = 'planned' | 'open' | 'closed' | 'review' | 'ranking' | 'decided' | 'archived'

export interface CallDates {
  opensAt: Date
  closesAt: Date
  graceUntil: Date
  assessmentsDueAt: Date
  reviewsDueAt: Date
  panelMeetsAt: Date
  lettersAt: Date
}

export interface CallKind {
  id: number
  kind: string
  title: string
  closesAt: Date | null
  pageLimit: number
  /** Words of a justification written here. */
  wordLimit: number
  abstractLimit: number
  /** Figures of a justification written here; null for as many as there can be. */
  figureLimit: number | null
  maxSeconds: number | null
  feeMinor: number
  panelId: number
  /** Must name a student and a supervisor, both of whom have agreed. */
  needsStudent: boolean
  /** Targets it may name; null for as many as a proposal holds. */
  targetLimit: number | null
  /** May ask for what is awaited and has no position yet. */
  takesAwaited: boolean
  /** Must say how often each observation is repeated. */
  needsCadence: boolean
  /** Must say by when each observation is needed. */
  needsLastNight: boolean
}

export interface CallPanel {
  id: number
  name: string
  /** Members needed to decide. */
  quorum: number
  /** Members who sit on it now. */
  members: number
}

export interface CallCriterion {
  id: number
  position: number
  title: string
  prompt: string
  weight: number
  criterionVersion: number
}

export interface Call extends CallDates {
  id: number
  number: number
  slug: string
  title: string
  summary: string
  siteId: number
  stage: 'planned' | 'published' | 'review' | 'ranking' | 'decided' | 'archived'
  /** Evening dates, inclusive. */
  seasonFrom: string
  seasonTo: string
  /** Null when the call has no fee: then nothing on screen speaks of one. */
  currency: string | null
  version: number
}

/** Sun and Moon over a season at the site. */
export interface Season {
  grid: SeasonGrid
  phases: { phase: string; at: Date }[]
  /** Astronomical night in all, hours. */
  darkHours: number
}

/** A dated correction of a published call. */
export interface Correction {
  id: number
  /** What it corrects, in a few words. */
  concerns: string
  body: string
  at: Date
}

/** What a call offers on one telescope. */
export interface TelescopeOfferView {
  telescope: string
  apertureM: number
  instruments: string[]
  nights: number
  darkSeconds: number
}
