import { ScienceError } from '../ScienceError'
import type { Timeline } from './timeline'

const superscript = (n: number): string =>
  String(n).replace(/\d/g, (digit) => '⁰¹²³⁴⁵⁶⁷⁸⁹'.charAt(Number(digit)))

/** A redshift as it is said: two decimals, or as many digits as its size asks for. */
export function sayRedshift(z: number): string {
  if (z >= 1e6) {
    const [mantissa, exponent] = z.toExponential(1).split('e')
    return `${mantissa} × 10${superscript(Number(exponent))}`
  }
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
    if (z === Infinity) throw new ScienceError('bad-redshift', 'A redshift must be a finite number.')
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
