import type { TargetGroup } from '../proposals/types'

export type Verdict = 'feasible' | 'marginal' | 'not-feasible'

export interface FeasibilityCheck {
  id: string
  name: string
  measured: string
  feasibleTo: string
  failsAt: string
  verdict: Verdict
  why: string
  fix: string | null
}

/** Numbers of one target under the chosen cosmology; null where the target has no redshift or no position. */
export interface TargetComputation {
  targetId: number
  luminosityMpc: number | null
  angularDiameterMpc: number | null
  comovingMpc: number | null
  kpcPerArcsec: number | null
  distanceModulusMag: number | null
  lookbackGyr: number | null
  ageGyr: number | null
  /** Dark hours in the season above the airmass asked for, and by month ('2027-07'). */
  visibleHours: number | null
  visibleHoursByMonth: { month: string; hours: number }[]
  /** Hours a night, in the order of the season's evenings. */
  visibleHoursByNight: number[]
  /** Why something could not be computed, in a sentence. */
  refusal: string | null
  /** The same under the comparison cosmology. */
  comparison: { luminosityMpc: number; kpcPerArcsec: number; lookbackGyr: number } | null
}

/** What the exposure rests on, for those who want to check it. */
export interface ExposureFacts {
  /** Delivered image, full width at half maximum. */
  imageArcsec: number
  /** Radius of the aperture of best signal-to-noise, and its share of the light. */
  apertureRadiusArcsec: number
  enclosedFraction: number
  pixels: number
  skyAbArcsec2: number
  skyBand: string
  /** Of full well, in the brightest pixel. */
  peakFraction: number
  wavelengthA: number
  regime: 'source' | 'sky' | 'read' | 'floor'
  regimeShare: number
  /** Time goes as the flux to this power, and as the luminosity distance to that. */
  timeExponentOfFlux: number
  timeExponentOfDistance: number
  cosmologyMatters: boolean
  /** Electrons gathered in the open shutter needed, and their variances. */
  signalE: number
  variance: { source: number; sky: number; dark: number; read: number; floor: number }
  warnings: string[]
}

export interface ObservationComputation {
  observationId: number
  targetId: number
  neededSeconds: number | null
  openShutterSeconds: number | null
  overheadSeconds: number | null
  subExposures: number | null
  subExposureSeconds: number | null
  snrReached: number | null
  /** What limits it, in a sentence. */
  regime: string | null
  observedFeatureA: number | null
  /** Dark hours within the Moon and date limits asked for; null without a position. */
  usableHours: number | null
  exposure: ExposureFacts | null
  /** How the magnitude came from its band to the mode; what was computed before it was told has none. */
  carried?: { sentence: string; isAssumed: boolean } | null
  checks: FeasibilityCheck[]
  verdict: Verdict
  refusal: string | null
  /** How often its hours count in those of the proposal: 0 for a backup, a target of opportunity once a trigger. */
  times: number
}

/** How a group of targets stands against its rule. */
export interface GroupComputation {
  name: string
  rule: TargetGroup['rule']
  atLeast: number | null
  hoursFor: TargetGroup['hoursFor']
  /** How many targets it lists, and how they stand; `unasked` are those nothing observes yet. */
  size: number
  feasible: number
  marginal: number
  notFeasible: number
  unasked: number
  /** What its hours add to those asked, seconds. */
  askedSeconds: number
  /** Null while nothing is in it. */
  verdict: Verdict | null
}

/** Everything computed for a proposal: same contents and engine, same bytes. */
export interface ProposalComputation {
  engineVersion: string
  cosmologyName: string
  recordVersions: Record<string, number>
  targets: TargetComputation[]
  observations: ObservationComputation[]
  groups: GroupComputation[]
  askedSeconds: number
  neededSeconds: number
  /** Asked hours over the mean dark hours of a night. */
  askedNights: number
  checksClear: number
  checksTotal: number
  verdict: Verdict | null
}
