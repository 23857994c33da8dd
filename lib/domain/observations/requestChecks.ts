import { formatCalendarDate } from '@/lib/format'
import { separationArcsec } from '@/lib/science/sky'
import type { ModeRecord } from '../facility/types'
import type { Observation, Target } from '../proposals/types'
import { samePlaceArcsec } from './clashes'
import type { FeasibilityCheck } from './types'

type Limits = Partial<Pick<FeasibilityCheck, 'feasibleTo' | 'failsAt'>>

const check = (
  id: string,
  name: string,
  rest: Omit<FeasibilityCheck, 'id' | 'name' | 'feasibleTo' | 'failsAt'> & Limits,
): FeasibilityCheck => ({ id, name, feasibleTo: '–', failsAt: '–', ...rest })

/** A request that names something the engine cannot start from: each gap is a check that is not clear. */
export function gapChecks(target: Target, isForLine: boolean): FeasibilityCheck[] {
  const gaps: FeasibilityCheck[] = []
  // What is awaited has no position yet: when it is up cannot be judged, and nobody can mend that.
  if (target.raDeg === null && !target.opportunity)
    gaps.push(
      check('position-given', 'Position given', {
        measured: 'none',
        feasibleTo: 'a position',
        verdict: 'marginal',
        why: 'Without a position nothing says when the target is up.',
        fix: 'Give its right ascension and declination.',
      }),
    )
  if (target.brightness === null && !isForLine)
    gaps.push(
      check('brightness-given', 'Brightness given', {
        measured: 'none',
        feasibleTo: 'a magnitude',
        verdict: 'not-feasible',
        why: 'Without a brightness no exposure can be computed.',
        fix: target.line
          ? `Give a magnitude, or ask for ${target.line.name}, whose brightness is known.`
          : 'Give a magnitude with its band and system.',
      }),
    )
  return gaps
}

/** The mode a request names must be on offer. */
export const modeGone = (): FeasibilityCheck =>
  check('mode-on-offer', 'Mode on offer', {
    measured: 'withdrawn',
    feasibleTo: 'on offer',
    failsAt: 'not on offer',
    verdict: 'not-feasible',
    why: 'The mode asked for is not on offer in this call.',
    fix: 'Choose a mode that is.',
  })

/** The evenings asked for must lie in the season. */
export const outsideSeason = (from: string, to: string): FeasibilityCheck =>
  check('dates-in-season', 'Dates in the season', {
    measured: 'outside',
    feasibleTo: 'inside',
    failsAt: 'outside',
    verdict: 'not-feasible',
    why: `The evenings asked for lie outside the season, ${formatCalendarDate(from)} to ${formatCalendarDate(to)}.`,
    fix: 'Ask for evenings of the season, or leave the dates open.',
  })

function apartArcsec(a: Target, b: Target): number {
  if (a.id === b.id) return 0
  if (a.raDeg === null || b.raDeg === null || a.decDeg === null || b.decDeg === null) return Infinity
  // No two places are nearer than their declinations; spares a long list all but a few angles.
  if (Math.abs(a.decDeg - b.decDeg) * 3600 > samePlaceArcsec) return Infinity
  return separationArcsec({ raDeg: a.raDeg, decDeg: a.decDeg }, { raDeg: b.raDeg, decDeg: b.decDeg })
}

/** The same position, mode and feature must not be asked for twice in one request. */
export function notAskedTwice(
  observation: Observation,
  mode: ModeRecord | undefined,
  observations: readonly Observation[],
  targets: ReadonlyMap<number, Target>,
): FeasibilityCheck | null {
  const own = targets.get(observation.targetId)
  if (!own || !mode) return null
  const twin = observations.find((other) => {
    const target = targets.get(other.targetId)
    return (
      other.id !== observation.id &&
      other.modeId === observation.modeId &&
      other.featureRestA === observation.featureRestA &&
      target !== undefined &&
      apartArcsec(own, target) <= samePlaceArcsec
    )
  })
  const name = twin ? targets.get(twin.targetId)?.name : null
  return check('not-asked-twice', 'Not asked twice', {
    measured: twin ? 'one' : 'none',
    feasibleTo: `none in ${samePlaceArcsec}″`,
    failsAt: 'same mode',
    verdict: twin ? 'not-feasible' : 'feasible',
    why: twin
      ? `${name ?? 'Another target'} is asked for with ${mode.name} at this position as well.`
      : 'No other observation here has this position, mode and feature.',
    fix: twin ? 'Leave one of the two out.' : null,
  })
}
