import { ScienceError } from '../ScienceError'
import type { Timeline } from './timeline'

/** A redshift as it is said: 3 significant figures, no trailing zeros beyond two decimals. */
export function sayRedshift(z: number): string {
  const digits = Math.abs(z) >= 100 ? z.toFixed(0) : Math.abs(z) >= 0.1 ? z.toFixed(2) : z.toPrecision(2)
  return digits.replace('-', '−')
}

/** Turns z into x = ln(1+z), refusing what a universe does not have. */
export interface RedshiftCheck {
  /** For times and densities: past and future. */
  any(z: number): number
  /** For distances: z >= 0. */
  seen(z: number): number
}

export function createRedshiftCheck(name: string, timeline: Timeline): RedshiftCheck {
  const { pastEnd, pastTurn } = timeline
  const deepest = Math.expm1(pastEnd)

  function refusePast(z: number): never {
    const asked = sayRedshift(z)
    if (pastTurn?.kind === 'turn') {
      throw new ScienceError(
        'past-the-turn',
        `${name} has no big bang: it turned at z = ${sayRedshift(deepest)}, so z = ${asked} does not exist in it.`,
      )
    }
    if (pastTurn) {
      throw new ScienceError(
        'past-the-turn',
        `${name} comes from a static state at z = ${sayRedshift(Math.expm1(pastTurn.x))}, so z = ${asked} cannot be seen in it.`,
      )
    }
    throw new ScienceError('bad-redshift', `z = ${asked} is too large: the engine stops at z = 10⁹.`)
  }

  function refuseFuture(z: number): never {
    if (Number.isNaN(z)) throw new ScienceError('bad-redshift', 'A redshift must be a number.')
    if (z <= -1) throw new ScienceError('bad-redshift', 'A redshift lies above −1.')
    if (timeline.futureTurn()) {
      throw new ScienceError(
        'past-the-turn',
        `${name} stops growing at z = ${sayRedshift(Math.expm1(timeline.futureEnd()))}, so z = ${sayRedshift(z)} does not exist in it.`,
      )
    }
    throw new ScienceError('bad-redshift', 'This redshift lies too far in the future for the engine.')
  }

  return {
    any(z) {
      const x = Math.log1p(z)
      if (x >= 0) return z <= deepest ? x : refusePast(z)
      // The future is worked out only when someone asks for it.
      return x >= timeline.futureEnd() ? x : refuseFuture(z)
    },
    seen(z) {
      if (z >= 0) return z <= deepest ? Math.log1p(z) : refusePast(z)
      if (z > -1) throw new ScienceError('bad-redshift', 'A distance needs a redshift of 0 or more.')
      return refuseFuture(z)
    },
  }
}
