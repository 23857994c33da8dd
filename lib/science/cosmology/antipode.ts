import { brent } from '../numeric/brent'
import { ScienceError } from '../ScienceError'
import { sayRedshift } from './redshiftCheck'
import type { Timeline } from './timeline'

/** The far end of a closed space: chi sqrt|Ok0| = pi, where every direction meets again. */
export interface Antipode {
  /** Returns chi when it lies short of the antipode, else throws with the antipode's redshift. */
  guard(chi: number, z: number): number
  /** Null when space is not closed, or the antipode lies beyond the largest redshift. */
  redshift(): number | null
}

export function createAntipode(name: string, Ok0: number, timeline: Timeline): Antipode {
  if (Ok0 >= 0) return { guard: (chi) => chi, redshift: () => null }
  const limit = Math.PI / Math.sqrt(-Ok0)
  const redshift = (): number | null => {
    const path = timeline.distance()
    if (path.total <= limit) return null
    return Math.expm1(brent((x) => path.read(x) - limit, 0, path.end))
  }
  return {
    redshift,
    guard(chi, z) {
      if (chi <= limit) return chi
      const there = sayRedshift(redshift() ?? z)
      throw new ScienceError(
        'past-the-antipode',
        `${name} is closed and its antipode lies at z = ${there}: at z = ${sayRedshift(z)} distances repeat.`,
      )
    },
  }
}
