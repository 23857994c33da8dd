import { ARCSEC_RAD } from '../constants'
import { slot } from '../numeric/slot'
import { ScienceError } from '../ScienceError'
import { finite } from './finite'
import { transverseFactor, volumeFactor } from './curvature'
import type { Timeline } from './timeline'
import type { CosmologyQuantity } from './types'

/** What loops over many redshifts read: tables, and the slower way for what no table has. */
export interface BatchSource {
  readonly H0: number
  readonly Ok0: number
  readonly hubbleDistanceMpc: number
  readonly hubbleTimeGyr: number
  readonly one: Readonly<Record<CosmologyQuantity, (z: number) => number>>
  readonly tables: Timeline['tables']
  /** Line-of-sight distance, lookback time and age in Hubble units. */
  chi(z: number): number
  lookback(z: number): number
  age(z: number): number
  /** Passes a distance on, or refuses it past the antipode. */
  guard(chi: number, z: number): number
}

type Fill = (z: Float64Array, out: Float64Array) => void

/**
 * Quantities of whole arrays. Those that rest on a table are read in one pass and finished in another, in
 * loops without calls; the rest go one by one. Each gives what the function of one redshift gives, bit for bit.
 */
export function createBatch(
  source: BatchSource,
): (quantity: CosmologyQuantity, redshifts: Float64Array, out?: Float64Array) => Float64Array {
  const { Ok0, hubbleDistanceMpc: dH, hubbleTimeGyr: tH, one } = source

  const scale = (out: Float64Array, factor: number): void => {
    for (let i = 0; i < out.length; i += 1) out[i] = factor * slot(out, i)
  }
  const across: Fill = (z, out) => {
    source.tables.distance().fill(z, out, source.chi)
    if (Ok0 === 0) return scale(out, dH)
    for (let i = 0; i < out.length; i += 1) {
      const d = Ok0 < 0 ? source.guard(slot(out, i), slot(z, i)) : slot(out, i)
      out[i] = dH * d * transverseFactor(Ok0 * d * d)
    }
  }
  const luminosity: Fill = (z, out) => {
    across(z, out)
    for (let i = 0; i < out.length; i += 1) out[i] = (1 + slot(z, i)) * slot(out, i)
  }
  const fills: Partial<Record<CosmologyQuantity, Fill>> = {
    comovingMpc(z, out) {
      source.tables.distance().fill(z, out, source.chi)
      scale(out, dH)
    },
    transverseComovingMpc: across,
    angularDiameterMpc(z, out) {
      across(z, out)
      for (let i = 0; i < out.length; i += 1) out[i] = slot(out, i) / (1 + slot(z, i))
    },
    luminosityMpc: luminosity,
    distanceModulusMag(z, out) {
      luminosity(z, out)
      for (let i = 0; i < out.length; i += 1) out[i] = modulusMag(slot(out, i))
    },
    kpcComovingPerArcsec(z, out) {
      across(z, out)
      for (let i = 0; i < out.length; i += 1) out[i] = slot(out, i) * ARCSEC_RAD * 1e3
    },
    kpcPerArcsec(z, out) {
      across(z, out)
      for (let i = 0; i < out.length; i += 1) out[i] = (slot(out, i) * ARCSEC_RAD * 1e3) / (1 + slot(z, i))
    },
    comovingVolumeMpc3(z, out) {
      source.tables.distance().fill(z, out, source.chi)
      const whole = 4 * Math.PI * dH ** 3
      for (let i = 0; i < out.length; i += 1) {
        const d = Ok0 < 0 ? source.guard(slot(out, i), slot(z, i)) : slot(out, i)
        out[i] = finite(whole * (d * d * d) * volumeFactor(Ok0 * d * d))
      }
    },
    differentialVolumeMpc3Sr(z, out) {
      across(z, out)
      for (let i = 0; i < out.length; i += 1) {
        const d = slot(out, i)
        out[i] = finite((dH * d * d) / one.E(slot(z, i)))
      }
    },
    E(z, out) {
      source.tables.E().fill(z, out, one.E)
    },
    hubbleKmSMpc(z, out) {
      source.tables.E().fill(z, out, one.E)
      for (let i = 0; i < out.length; i += 1) out[i] = finite(source.H0 * slot(out, i))
    },
    lookbackGyr(z, out) {
      source.tables.pastTime().fill(z, out, source.lookback)
      scale(out, tH)
    },
    ageGyr(z, out) {
      const table = source.tables.age()
      if (table) table.fill(z, out, source.age)
      else for (let i = 0; i < out.length; i += 1) out[i] = source.age(slot(z, i))
      scale(out, tH)
    },
  }

  return (quantity, redshifts, out = new Float64Array(redshifts.length)) => {
    if (out.length !== redshifts.length)
      throw new ScienceError(
        'bad-parameter',
        'The array to write into has another length than the redshifts.',
      )
    // Finishing reads the redshifts again, so they must not have been written over.
    const z = redshifts.buffer === out.buffer ? redshifts.slice() : redshifts
    const fill = fills[quantity]
    if (fill) fill(z, out)
    else for (let i = 0; i < z.length; i += 1) out[i] = one[quantity](slot(z, i))
    return out
  }
}

/** Distance modulus of a luminosity distance, Mpc. */
export function modulusMag(luminosityMpc: number): number {
  if (luminosityMpc > 0) return 5 * Math.log10(luminosityMpc) + 25
  throw new ScienceError('bad-redshift', 'A distance modulus needs a redshift above 0.')
}
