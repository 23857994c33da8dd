import { expansionHistory } from '@/lib/science/cosmology'
import { formatNumber } from '@/lib/format'
import { ScienceError } from '@/lib/science/ScienceError'
import type { ReadyUniverse } from './universes'

export interface History {
  place: number
  name: string
  /** Gyr from now, and size against now; earliest first. */
  points: [number, number][]
  /** `turned 18.4 Gyr ago`, `tears apart in 22.0 Gyr`; null where nothing ends. */
  event: string | null
}

export interface Histories {
  histories: History[]
  /** Gyr from now. */
  domain: [number, number]
  /** Size that the plot reaches, now = 1. */
  largest: number
}

const POINTS = 160
const SMALLEST = 1e-3
/** Sizes drawn, unless one that turns back lies a little beyond. */
const LARGEST = 2.2
const LARGEST_TURN = 5
/** Gyr that are drawn of the past at most, and of the future unless something ends there a little later. */
const PAST = 60
const FUTURE = 20
const FURTHEST_END = 100

const gyr = (time: number) => `${formatNumber(time, time < 100 ? 1 : 0)} Gyr`

function eventOf({ cosmology: { universe } }: ReadyUniverse): string | null {
  if (universe.origin === 'bounce' && universe.turnaroundGyr !== null)
    return `turned ${gyr(universe.turnaroundGyr)} ago`
  if (universe.fate === 'big-rip' && universe.ripInGyr !== null)
    return `tears apart in ${gyr(universe.ripInGyr)}`
  if (universe.greatestSizeInGyr !== null) return `largest in ${gyr(universe.greatestSizeInGyr)}`
  return null
}

/** The largest size drawn: that of the last universe to turn back, where it is within reach. */
function largestOf(universes: readonly ReadyUniverse[]): number {
  const turns = universes
    .filter(({ cosmology }) => cosmology.universe.greatestSizeInGyr !== null)
    .map(({ cosmology }) => 1.1 / (1 + cosmology.furthestRedshift))
  return turns.filter((size) => size <= LARGEST_TURN).reduce((most, size) => Math.max(most, size), LARGEST)
}

/** The moments of one universe; none where it never has any of the sizes drawn. */
function momentsOf({ cosmology }: ReadyUniverse, largest: number): [number, number][] {
  try {
    return expansionHistory(cosmology, SMALLEST, largest, POINTS).map(({ gyrFromNow, scaleFactor }) => [
      gyrFromNow,
      scaleFactor,
    ])
  } catch (error) {
    if (error instanceof ScienceError) return []
    throw error
  }
}

/** The size of every universe against time: from its beginning or its turn into the future, to its end if it is near. */
export function historiesOf(universes: readonly ReadyUniverse[]): Histories {
  const largest = largestOf(universes)
  const all = universes.map((universe): History => ({
    place: universe.place,
    name: universe.name,
    points: momentsOf(universe, largest),
    event: eventOf(universe),
  }))
  const begins = all.map(({ points }) => -(points[0]?.[0] ?? 0))
  const past = Math.min(PAST, begins.reduce((most, time) => Math.max(most, time), 1) * 1.08)
  // Only what falls back together comes to an end inside the sizes drawn.
  const ends = all.flatMap(({ points }) => {
    const [time = 0, size = 1] = points[points.length - 1] ?? []
    return size < 0.5 && time <= FURTHEST_END ? [time] : []
  })
  const future = ends.reduce((most, time) => Math.max(most, time * 1.05), FUTURE)
  const shown = ([time, size]: [number, number]) => time >= -past && time <= future && size <= largest
  return {
    histories: all.map((one) => ({ ...one, points: one.points.filter(shown) })),
    domain: [-past, future],
    largest,
  }
}
