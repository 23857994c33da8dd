import type { Density } from './density'
import { createIntegralTable } from './integralTable'
import { createPath, knotsTo, type Path } from './path'
import { meansOnPieces, overOnePlusZ, pieceLow, startsOfPieces, valuesOnPieces } from './redshiftPieces'
import { createRedshiftTable, type RedshiftTable } from './redshiftTable'
import { DEEPEST_X, findTurn, FURTHEST_X, type Turn } from './turns'

/** How far from a static state a redshift must stay: nearer, time and distance grow without limit. */
const STATIC_MARGIN = 1e-3

/** What the expansion does on both sides of now, with its running integrals, each made when first asked for. */
export interface Timeline {
  readonly pastTurn: Turn | null
  /** ln(1+z) of the largest redshift there is, or that the engine follows. */
  readonly pastEnd: number
  futureTurn(): Turn | null
  /** ln(1+z) of the furthest future. */
  futureEnd(): number
  /** Line-of-sight comoving distance over the Hubble distance. */
  distance(): Path
  /** Lookback time over the Hubble time, past and future. */
  pastTime(): Path
  futureTime(): Path
  /** Time since the big bang over the Hubble time; null where there was none. */
  age(): ((x: number) => number) | null
  /** The same three, and E, by redshift, for z from 0 to some 2000 and away from turns. */
  readonly tables: {
    E(): RedshiftTable
    distance(): RedshiftTable
    pastTime(): RedshiftTable
    age(): RedshiftTable | null
  }
}

/** A value computed when first asked for and kept; so is a refusal, which would cost as much again each time. */
function once<T>(make: () => T): () => T {
  let kept: (() => T) | null = null
  return () => {
    if (kept) return kept()
    try {
      const value = make()
      kept = () => value
    } catch (error) {
      kept = () => {
        throw error
      }
    }
    return kept()
  }
}

function endOf(turn: Turn | null, open: number): number {
  if (!turn) return open
  return turn.kind === 'turn' ? turn.x : turn.x - Math.sign(turn.x) * STATIC_MARGIN
}

/**
 * Time before x = DEEPEST_X, where E grows as a power n of 1+z: 1/(n E). Null when E does not grow, as in
 * de Sitter space: such a universe had no beginning.
 */
function timeBefore(density: Density): number | null {
  const E2 = density.E2(DEEPEST_X)
  const n = density.slopeE2(DEEPEST_X) / (2 * E2)
  return n > 1e-9 ? 1 / (n * Math.sqrt(E2)) : null
}

export function createTimeline(density: Density): Timeline {
  const pastTurn = findTurn(density, DEEPEST_X)
  const pastEnd = endOf(pastTurn, DEEPEST_X)
  const pastTurns = pastTurn?.kind === 'turn'
  const futureTurn = once(() => findTurn(density, FURTHEST_X))
  const futureEnd = once(() => endOf(futureTurn(), FURTHEST_X))
  const futureTime = once(() => createPath(density, 0, futureEnd(), futureTurn()?.kind === 'turn'))
  const distance = once(() => createPath(density, 1, pastEnd, pastTurns))
  const pastTime = once(() => createPath(density, 0, pastEnd, pastTurns))
  const age = once(() => createAge(density, pastTurn, futureTime))
  return {
    pastTurn,
    pastEnd,
    futureTurn,
    futureEnd,
    distance,
    pastTime,
    futureTime,
    age,
    tables: createTables(density, { pastEnd, distance, pastTime, age }),
  }
}

function createAge(
  density: Density,
  pastTurn: Turn | null,
  futureTime: () => Path,
): ((x: number) => number) | null {
  const before = pastTurn ? null : timeBefore(density)
  if (before === null) return null
  // Counted from the early end, so that the small ages of high redshifts keep their relative accuracy.
  const g = (s: number): number => 1 / Math.sqrt(density.E2(DEEPEST_X - s))
  const knots = knotsTo(DEEPEST_X)
    .map((x) => DEEPEST_X - x)
    .reverse()
  const table = createIntegralTable(g, knots)
  const now = before + table.total
  return (x) => (x >= 0 ? before + table.read(DEEPEST_X - x) : now - futureTime().read(x))
}

function createTables(
  density: Density,
  slow: Pick<Timeline, 'pastEnd' | 'distance' | 'pastTime' | 'age'>,
): Timeline['tables'] {
  const end = Math.expm1(slow.pastEnd)
  const E = (z: number): number => Math.sqrt(density.E2(Math.log1p(z), 1 + z))
  const distanceValues = once(() => valuesOnPieces((z) => 1 / E(z), end))
  const timeMeans = once(() => meansOnPieces(overOnePlusZ(distanceValues())))
  return {
    // As the running integral of its own slope, it is a table like the others.
    E: once(() => {
      const slope = (z: number): number => density.slopeE2(Math.log1p(z)) / (2 * E(z) * (1 + z))
      return createRedshiftTable(meansOnPieces(valuesOnPieces(slope, end)), (i) => E(pieceLow(i)), 1)
    }),
    distance: once(() => {
      const means = meansOnPieces(distanceValues())
      const start = startsOfPieces(means, end, (z) => slow.distance().read(Math.log1p(z)))
      return createRedshiftTable(means, start, 1)
    }),
    pastTime: once(() => {
      const start = startsOfPieces(timeMeans(), end, (z) => slow.pastTime().read(Math.log1p(z)))
      return createRedshiftTable(timeMeans(), start, 1)
    }),
    age: once(() => {
      const age = slow.age()
      return age && createRedshiftTable(timeMeans(), (i) => age(Math.log1p(pieceLow(i))), -1)
    }),
  }
}
