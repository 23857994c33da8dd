import type { Cosmology, CosmologyQuantity } from '@/lib/science/cosmology'
import { formatNumber } from '@/lib/format'
import { readQuantity } from './reading'
import type { ReadyUniverse } from './universes'

export interface Curve {
  place: number
  name: string
  points: [number, number][]
  /** Set where the universe ends inside the plot: `ends at its turn, z = 0.92`. */
  ends: string | null
}

export interface CurvePlot {
  curves: Curve[]
  domain: [number, number]
  /** Redshifts spread over more than two decades are drawn on a logarithmic axis. */
  log: boolean
  /** The highest point of the first curve, where it turns down inside the plot. */
  peak: [number, number] | null
}

const POINTS = 160
const LOG_FROM = 30
const FURTHEST = 1e9 * (1 - 1e-6)

/** The stretch of redshift to draw: what was asked, with some room. */
function domainOf(redshifts: readonly number[]): { domain: [number, number]; log: boolean } {
  const asked = redshifts.filter((z) => z > 0)
  const largest = asked.reduce((a, b) => Math.max(a, b), 0)
  if (largest > LOG_FROM) {
    const smallest = asked.reduce((a, b) => Math.min(a, b), 1)
    return { domain: [Math.min(0.1, smallest), Math.min(largest * 1.5, FURTHEST)], log: true }
  }
  const room = largest * 1.06
  const step = room > 4 ? 1 : room > 1 ? 0.5 : room > 0.1 ? 0.05 : 0.01
  return { domain: [0, largest === 0 ? 1 : Math.ceil(room / step) * step], log: false }
}

function samples([from, to]: [number, number], log: boolean, last: number): number[] {
  const end = Math.min(to, last)
  const zs = Array.from({ length: POINTS + 1 }, (_, i) =>
    log ? from * (to / from) ** (i / POINTS) : from + ((to - from) * i) / POINTS,
  ).filter((z) => z < end)
  // Close to a turn a curve bends within its last step.
  for (const share of [0.1, 0.03, 0.01, 1e-3, 1e-5]) zs.push(end - (end - (zs[zs.length - 1] ?? 0)) * share)
  return [...zs.sort((a, b) => a - b), end]
}

/** The largest redshift with a distance across the sky, and what ends there. */
function endOf({ antipodeRedshift, deepestRedshift, universe }: Cosmology): { last: number; what: string } {
  if (antipodeRedshift !== null) return { last: antipodeRedshift * (1 - 1e-9), what: 'antipode' }
  return { last: deepestRedshift, what: universe.origin === 'bounce' ? 'turn' : 'beginning' }
}

function curveOf(
  { place, name, cosmology }: ReadyUniverse,
  valueAt: (z: number) => number | null,
  domain: [number, number],
  log: boolean,
): Curve {
  const { last, what } = endOf(cosmology)
  const points = samples(domain, log, last).flatMap((z): [number, number][] => {
    const value = valueAt(z)
    return value === null ? [] : [[z, value]]
  })
  const ends = last < domain[1] ? `ends at its ${what}, z = ${formatNumber(last, 2)}` : null
  return { place, name, points, ends }
}

function peakOf(curve: Curve | undefined, wanted: boolean): [number, number] | null {
  if (!curve || !wanted) return null
  const highest = curve.points.reduce((best, point) => (point[1] > best[1] ? point : best), [0, 0])
  const last = curve.points[curve.points.length - 1]
  return last && highest[0] > 0 && highest[0] < last[0] * 0.9 && curve.ends === null ? highest : null
}

/** A quantity against redshift under every universe, over the stretch the reader's redshifts need. */
export function plotQuantity(
  universes: readonly ReadyUniverse[],
  quantity: CosmologyQuantity,
  redshifts: readonly number[],
): CurvePlot {
  const { domain, log } = domainOf(redshifts)
  const curves = universes.map((universe) =>
    curveOf(universe, (z) => readQuantity(universe.cosmology, quantity, z).value, domain, log),
  )
  const rises = quantity === 'angularDiameterMpc' || quantity === 'kpcPerArcsec'
  return { curves, domain, log, peak: peakOf(curves[0], rises) }
}

/** A quantity of every universe over the reference's, against redshift; differences for magnitudes. */
export function plotRatio(
  universes: readonly ReadyUniverse[],
  reference: ReadyUniverse,
  quantity: CosmologyQuantity,
  redshifts: readonly number[],
): CurvePlot {
  const { domain, log } = domainOf(redshifts)
  const from: [number, number] = [log ? domain[0] : domain[1] / 1000, domain[1]]
  const curves = universes.map((universe) =>
    curveOf(
      universe,
      (z) => {
        const one = readQuantity(universe.cosmology, quantity, z).value
        const other = readQuantity(reference.cosmology, quantity, z).value
        if (one === null || other === null) return null
        if (quantity === 'distanceModulusMag') return one - other
        return other === 0 ? null : one / other
      },
      from,
      log,
    ),
  )
  return { curves, domain, log, peak: null }
}
