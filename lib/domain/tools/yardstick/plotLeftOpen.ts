import { nearbyDistance } from '@/lib/science/cosmology'
import { ScienceError } from '@/lib/science/ScienceError'
import type { CurvePlot } from './curves'
import type { Surroundings } from './sheets/nearSheet'
import type { ReadyUniverse } from './universes'

const FROM = 1e-3
const POINTS = 120
/** Above this share, %, an error is no longer small and the curve says nothing more. */
export const MOST_OPEN = 60

/** Share of the distance, %, that a galaxy's own motion leaves open, against redshift; alike in every universe. */
export function plotLeftOpen(
  universe: ReadyUniverse,
  around: Surroundings,
  redshifts: readonly number[],
): CurvePlot {
  const to = Math.max(0.2, redshifts.reduce((most, z) => Math.max(most, z), 0) * 1.3)
  const points = Array.from({ length: POINTS + 1 }, (_, i) => FROM * (to / FROM) ** (i / POINTS)).flatMap(
    (z): [number, number][] => {
      try {
        return [[z, 100 * nearbyDistance(universe.cosmology, { ...around, redshift: z }).errorShare]]
      } catch (error) {
        if (error instanceof ScienceError) return []
        throw error
      }
    },
  )
  const shown = points.filter(([, share]) => share <= MOST_OPEN)
  const curve = {
    place: universe.place,
    name: `own motion of ${around.peculiarKmS ?? 300} km/s`,
    points: shown,
    ends: null,
  }
  return { curves: [curve], domain: [FROM, to], log: true, peak: null }
}
