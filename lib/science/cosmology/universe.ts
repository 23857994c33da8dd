import { brent } from '../numeric/brent'
import type { Density } from './density'
import type { CosmologyParameters } from './parameters'
import { describeUniverse } from './universeSentence'
import type { Timeline } from './timeline'

/** What kind of universe a set of parameters makes. Gyr, redshifts. */
export interface Universe {
  readonly shape: 'flat' | 'open' | 'closed'
  /** 'no-beginning': it grew for ever, as de Sitter space did, or left a static state. */
  readonly origin: 'big-bang' | 'bounce' | 'no-beginning'
  readonly fate: 'expands-forever' | 'recollapses' | 'big-rip'
  /** Time since the big bang; null without one. */
  readonly ageGyr: number | null
  /** Redshift of a bounce in the past or, failing that, of greatest size in the future (negative). */
  readonly turnaroundRedshift: number | null
  /** Time from now back to the bounce, or on to greatest size. */
  readonly turnaroundGyr: number | null
  /** From now to greatest size, whatever came before; null where growth goes on. */
  readonly greatestSizeInGyr: number | null
  /** Age at greatest size; null without one, or without a beginning. */
  readonly greatestSizeAgeGyr: number | null
  /** From big bang to big crunch; null unless both happen. */
  readonly recollapseAgeGyr: number | null
  /** From now to the big rip. */
  readonly ripInGyr: number | null
  /** Redshift since which the growth has been speeding up; null when it slows now, or always sped up. */
  readonly acceleratingSinceRedshift: number | null
  readonly accelerating: boolean
  /** The growth once fell to less than a third of today's and then picked up again. */
  readonly loitering: boolean
  readonly loiteringRedshift: number | null
  readonly sentence: string
}

/** Speed of growth against now under which a slow spell counts as loitering. Our own bound. */
const LOITERING_SPEED = 1 / 3
const STEP = 0.1

/** Where (d/dt)^2 a changes sign, and the slowest spell, looking back from now. */
function pastOfGrowth(
  density: Density,
  pastEnd: number,
  accelerating: boolean,
): [number | null, number | null] {
  const acceleration = (x: number): number => 2 * density.E2(x) - density.slopeE2(x)
  const speed = (x: number): number => Math.sqrt(Math.max(density.E2(x), 0)) * Math.exp(-x)
  let since: number | null = null
  let loitering: number | null = null
  for (let x = 0; x < pastEnd; x += STEP) {
    const next = Math.min(x + STEP, pastEnd)
    // Speeding up after, slowing before: the slowest moment of the growth lies between.
    if (acceleration(x) > 0 && acceleration(next) < 0) {
      const slowest = brent(acceleration, x, next)
      if (accelerating && since === null) since = slowest
      if (loitering === null && speed(slowest) < LOITERING_SPEED) loitering = slowest
    }
  }
  return [since, loitering]
}

function ripTime(density: Density, timeline: Timeline): number {
  const path = timeline.futureTime()
  const E2 = density.E2(path.end)
  if (!Number.isFinite(E2)) return -path.total
  // E grows as a power of a at the end: what is left is 1/(n E).
  return -path.total - (2 * E2) / (density.slopeE2(path.end) * Math.sqrt(E2))
}

/** Classifies a model by the zeros of E^2 and of the acceleration. Carroll, Press & Turner 1992 for matter and Lambda. */
export function classify(
  p: CosmologyParameters,
  density: Density,
  timeline: Timeline,
  hubbleTimeGyr: number,
): Universe {
  const age = timeline.age()
  const { pastTurn } = timeline
  const futureTurn = timeline.futureTurn()
  const bounce = pastTurn?.kind === 'turn'
  const recollapses = futureTurn?.kind === 'turn'
  const phantom = density.Ode0 > 0 && (p.wa > 0 || (p.wa === 0 && p.w0 < -1))
  const ageNow = age ? age(0) : null
  const toGreatest = recollapses ? -timeline.futureTime().total : null
  const accelerating = density.slopeE2(0) < 2 * density.E2(0)
  const [since, loitering] = pastOfGrowth(density, timeline.pastEnd, accelerating)
  const toBounce = bounce ? timeline.pastTime().total : null
  const turn = bounce ? pastTurn.x : recollapses ? futureTurn.x : null
  const turnTime = toBounce ?? toGreatest
  const rip = phantom && !recollapses ? ripTime(density, timeline) : null
  const facts: Omit<Universe, 'sentence'> = {
    // 1 − 0.3 − 0.7 is not quite 0 in a computer.
    shape: Math.abs(density.Ok0) < 1e-12 ? 'flat' : density.Ok0 > 0 ? 'open' : 'closed',
    origin: bounce ? 'bounce' : ageNow === null ? 'no-beginning' : 'big-bang',
    fate: recollapses ? 'recollapses' : rip !== null ? 'big-rip' : 'expands-forever',
    ageGyr: ageNow === null ? null : hubbleTimeGyr * ageNow,
    turnaroundRedshift: turn === null ? null : Math.expm1(turn),
    turnaroundGyr: turnTime === null ? null : hubbleTimeGyr * turnTime,
    greatestSizeInGyr: toGreatest === null ? null : hubbleTimeGyr * toGreatest,
    greatestSizeAgeGyr: ageNow === null || toGreatest === null ? null : hubbleTimeGyr * (ageNow + toGreatest),
    recollapseAgeGyr:
      ageNow === null || toGreatest === null ? null : 2 * hubbleTimeGyr * (ageNow + toGreatest),
    ripInGyr: rip === null ? null : hubbleTimeGyr * rip,
    acceleratingSinceRedshift: since === null ? null : Math.expm1(since),
    accelerating,
    loitering: loitering !== null,
    loiteringRedshift: loitering === null ? null : Math.expm1(loitering),
  }
  const sinceGyr = since === null ? null : hubbleTimeGyr * timeline.pastTime().read(since)
  return { ...facts, sentence: describeUniverse(facts, sinceGyr, pastTurn?.kind === 'static') }
}
