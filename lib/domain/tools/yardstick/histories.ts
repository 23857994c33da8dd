import { expansionHistory } from '@/lib/science/cosmology'
import { formatNumber } from '@/lib/format'
import type { ReadyUniverse } from './universes'

export interface History {
  place: number
  name: string
  /** Gyr from now, and size against now; earliest first. */
  points: [number, number][]
  /** `turned 18.4 Gyr ago`, `tears apart in 22 Gyr`; null where nothing ends. */
  event: string | null
}

const POINTS = 160
const SMALLEST = 1e-3
const LARGEST = 2.2
/** Gyr of the future that are drawn. */
const FUTURE = 20

function eventOf({ universe }: ReadyUniverse['cosmology']): string | null {
  const gyr = (time: number | null) => formatNumber(time, time !== null && time < 100 ? 1 : 0)
  if (universe.origin === 'bounce') return `turned ${gyr(universe.turnaroundGyr)} Gyr ago`
  if (universe.fate === 'big-rip') return `tears apart in ${gyr(universe.ripInGyr)} Gyr`
  if (universe.fate === 'recollapses' && universe.turnaroundGyr !== null)
    return `largest in ${gyr(universe.turnaroundGyr)} Gyr`
  return null
}

/** The size of every universe against time, from its beginning or its turn into the next twenty billion years. */
export function historiesOf(universes: readonly ReadyUniverse[]): {
  histories: History[]
  domain: [number, number]
} {
  const histories = universes.map(({ place, name, cosmology }): History => {
    const points = expansionHistory(cosmology, SMALLEST, LARGEST, POINTS).map(
      ({ gyrFromNow, scaleFactor }): [number, number] => [gyrFromNow, scaleFactor],
    )
    return { place, name, points, event: eventOf(cosmology) }
  })
  const begins = histories.map(({ points }) => points[0]?.[0] ?? 0)
  const past = Math.min(60, Math.max(...begins.map((time) => -time)) * 1.08)
  return {
    histories: histories.map((one) => ({ ...one, points: within(one.points, -past) })),
    domain: [-past, FUTURE],
  }
}

const within = (points: [number, number][], from: number) =>
  points.filter(([time, size]) => time >= from && time <= FUTURE && size <= LARGEST)
