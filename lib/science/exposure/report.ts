import type { Provenance, SnrPer } from './types'

export type Regime = 'source' | 'sky' | 'read' | 'floor'

/** What an exposure needs and gives. Same input and engine, same report. Seconds, electrons, arcseconds. */
export interface ExposureReport {
  readonly engineVersion: string
  readonly snr: number
  readonly per: SnrPer
  /** Open shutter. */
  readonly openS: number
  readonly subExposures: number
  readonly subExposureS: number
  readonly overheadS: number
  /** Open shutter and overheads. */
  readonly totalS: number
  readonly signalE: number
  /** Variances, electrons squared. */
  readonly variance: {
    readonly source: number
    readonly sky: number
    readonly dark: number
    readonly read: number
    readonly floor: number
  }
  /** What makes most of the noise; dark current counts with read noise. */
  readonly regime: Regime
  /** Its share of the noise squared. */
  readonly regimeShare: number
  /** Time goes as the flux to this power, -1 to -2 and steeper near the floor. */
  readonly timeExponentOfFlux: number
  /** Time goes as the luminosity distance to this power; 0 when the brightness was observed. */
  readonly timeExponentOfDistance: number
  readonly cosmologyMatters: boolean
  readonly wavelengthA: number
  readonly imageArcsec: number
  readonly apertureRadiusArcsec: number
  readonly enclosedFraction: number
  readonly pixels: number
  readonly skyAbArcsec2: number
  readonly skyBand: string
  readonly peakFraction: number
  readonly warnings: string[]
}

export function exponentOfDistance(exponentOfFlux: number, provenance: Provenance): number {
  return provenance === 'predicted' ? -2 * exponentOfFlux : 0
}
