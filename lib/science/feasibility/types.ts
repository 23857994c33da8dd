import type { Cosmology } from '../cosmology'
import type {
  ExposureReport,
  Geometry,
  ModeRecord,
  MoonClass,
  Provenance,
  SiteRecord,
  SnrPer,
} from '../exposure'
import type { SpectralShape } from '../light'
import type { PointingLimits, TargetVisibility } from '../sky'

export type Verdict = 'feasible' | 'marginal' | 'not-feasible'

/** One question asked of a request: what was measured, its own two limits, and what follows. */
export interface Check {
  readonly id: string
  readonly name: string
  readonly measured: string
  readonly feasibleTo: string
  readonly failsAt: string
  readonly verdict: Verdict
  readonly why: string
  readonly fix: string | null
}

export interface ReportTarget {
  readonly id: string | number
  readonly name: string
  readonly raDeg: number | null
  readonly decDeg: number | null
  readonly pmRaMasYr?: number
  readonly pmDecMasYr?: number
  readonly redshift: number | null
  readonly redshiftError?: number | null
  readonly redshiftType?: 'spectroscopic' | 'photometric' | 'assumed'
  readonly geometry?: Geometry
  /** An emission line, by the name of the feature it is; its flux in erg/s/cm^2 or its luminosity in erg/s. */
  readonly line?: {
    readonly name: string
    readonly kind: 'flux' | 'luminosity'
    readonly value: number
    /** Intrinsic full width at half maximum. */
    readonly widthKmS: number
  } | null
  /** Shape of its continuum before dust and gas; flat in f_nu, and said so, when not given. */
  readonly spectrum?: SpectralShape | null
  /** Of the Galaxy, from the SFD map; dims what is predicted. */
  readonly galacticEbv?: number | null
  /** By a lens; brightens what is predicted. */
  readonly magnification?: number | null
  readonly brightness: {
    readonly value: number
    readonly system: 'AB' | 'Vega' | 'ST'
    readonly band: string
    readonly provenance: Provenance
  } | null
}

export interface ReportObservation {
  readonly id: string | number
  readonly snr: number
  readonly snrPer: SnrPer
  /** The line or edge a spectrum is taken for, vacuum rest wavelength. */
  readonly feature: { readonly name: string; readonly restA: number } | null
  readonly askedS: number
  readonly maxAirmass: number
  /** Poorest seeing accepted, at the zenith and 500 nm. */
  readonly seeingArcsec: number
  readonly moon: MoonClass
  readonly minMoonSeparationDeg?: number
  /** Share of light let through by the thickest clouds accepted. */
  readonly transparency?: number
}

/** The continuum where a mode sees it, and how its magnitude came there. */
export interface CarriedLight {
  readonly ab: number
  /** Magnitudes added between the band and the mode; 0 where no shape is stated. */
  readonly colourMag: number
  /** The mode works far from the band and no shape is stated. */
  readonly isAssumed: boolean
  readonly sentence: string | null
}

export interface Season {
  /** First and last evening date, both included. */
  readonly from: string
  readonly to: string
}

export interface ReportInput {
  readonly cosmology: Cosmology
  readonly site: SiteRecord
  /** Horizons and blind spot, besides the lowest altitude of the site. */
  readonly pointing?: Omit<PointingLimits, 'lowestAltitudeDeg'>
  readonly target: ReportTarget
  readonly mode: ModeRecord
  readonly observation: ReportObservation
  readonly season: Season
}

export interface ObservationReport {
  readonly engineVersion: string
  readonly checks: Check[]
  readonly clear: number
  readonly verdict: Verdict
  /** Null when it could not be computed; `refusal` says why. */
  readonly exposure: ExposureReport | null
  readonly refusal: string | null
  /** How the magnitude of the continuum was carried to the mode; null where there is nothing to say. */
  readonly carried: { readonly sentence: string; readonly isAssumed: boolean } | null
  /** Open shutter and overheads at the site's median seeing, and on its best tenth of nights. */
  readonly totalAtMedianS: number | null
  readonly totalAtBestS: number | null
  readonly observedFeatureA: number | null
  /** Dark hours above the airmass limit, the Moon left aside; null without a position. */
  readonly visibility: TargetVisibility | null
  /** The same within the Moon limits of the request. */
  readonly usableHours: number | null
}
