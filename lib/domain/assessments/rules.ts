import { formatHoursFromSeconds } from '@/lib/format'
import type { ModeRecord } from '../facility/types'
import type { ObservationComputation, Verdict } from '../observations/types'
import { worstVerdict } from '../observations/worstVerdict'
import { needOf, type Need } from '../observations/needOf'
import type { Observation, Target, TargetGroup } from '../proposals/types'
import type { AssessmentVerdict } from './types'

export const longestReason = 160

/** One target of a request on one instrument: hours computed against hours asked. */
export interface TargetHours {
  targetId: number
  name: string
  need: Need
  /** How often its hours count; those of a backup do not. */
  times: number
  modes: string[]
  openSeconds: number
  overheadSeconds: number
  neededSeconds: number
  askedSeconds: number
  verdict: Verdict
}

interface RequestParts {
  groups: readonly TargetGroup[]
  targets: readonly Pick<Target, 'id' | 'name' | 'need' | 'group'>[]
  observations: readonly Pick<Observation, 'id' | 'targetId' | 'modeId' | 'askedSeconds'>[]
  modes: readonly Pick<ModeRecord, 'modeId' | 'name' | 'instrument'>[]
  computed: readonly Pick<
    ObservationComputation,
    'observationId' | 'openShutterSeconds' | 'overheadSeconds' | 'neededSeconds' | 'verdict' | 'times'
  >[]
}

/** The observations of a request made with one instrument. */
export function observationsOn<O extends { modeId: number }>(
  observations: readonly O[],
  modes: readonly Pick<ModeRecord, 'modeId' | 'instrument'>[],
  instrumentId: number,
): O[] {
  const on = new Set(
    modes.filter(({ instrument }) => instrument.id === instrumentId).map(({ modeId }) => modeId),
  )
  return observations.filter(({ modeId }) => on.has(modeId))
}

/**
 * Hours of each target on one instrument, in the order of the target table: of a target of opportunity those of all its
 * triggers, of a backup its own, though they do not count.
 */
export function targetHours(parts: RequestParts, instrumentId: number): TargetHours[] {
  const computed = new Map(parts.computed.map((row) => [row.observationId, row]))
  const names = new Map(parts.modes.map(({ modeId, name }) => [modeId, name]))
  const own = observationsOn(parts.observations, parts.modes, instrumentId)
  return parts.targets.flatMap((target) => {
    const rows = own.filter(({ targetId }) => targetId === target.id)
    if (rows.length === 0) return []
    const times = Math.max(0, ...rows.map(({ id }) => computed.get(id)?.times ?? 1))
    const sum = (of: (row: (typeof rows)[number]) => number | null | undefined) =>
      rows.reduce((total, row) => total + (of(row) ?? 0), 0) * Math.max(1, times)
    const verdicts = rows.flatMap(({ id }) => computed.get(id)?.verdict ?? [])
    return [
      {
        targetId: target.id,
        name: target.name,
        need: needOf(target, parts.groups),
        times,
        modes: [...new Set(rows.map(({ modeId }) => names.get(modeId) ?? ''))],
        openSeconds: sum(({ id }) => computed.get(id)?.openShutterSeconds),
        overheadSeconds: sum(({ id }) => computed.get(id)?.overheadSeconds),
        neededSeconds: sum(({ id }) => computed.get(id)?.neededSeconds),
        askedSeconds: sum(({ askedSeconds }) => askedSeconds),
        verdict: worstVerdict(verdicts) ?? 'feasible',
      },
    ]
  })
}

/** The seconds that count, of the rows of one instrument. */
export const countedSeconds = (
  rows: readonly TargetHours[],
  of: 'openSeconds' | 'overheadSeconds' | 'neededSeconds' | 'askedSeconds',
): number => rows.reduce((sum, row) => sum + (row.times > 0 ? row[of] : 0), 0)

/**
 * True seconds of each target when only their sum was said: the open shutter stays, what is more or less than computed
 * is shared over the overheads. What does not count has no share in it.
 */
export function trueSecondsByTarget(rows: readonly TargetHours[], trueSeconds: number): number[] {
  const more = trueSeconds - countedSeconds(rows, 'neededSeconds')
  const overheads = countedSeconds(rows, 'overheadSeconds')
  const counting = rows.filter(({ times }) => times > 0).length
  return rows.map(({ neededSeconds, overheadSeconds, times }) => {
    if (times === 0) return neededSeconds
    const share = overheads > 0 ? (more * overheadSeconds) / overheads : more / counting
    return Math.max(0, neededSeconds + share)
  })
}

/** Why a verdict and true hours do not go together, as a message at the true hours; null when they do. */
export function hoursProblem(
  verdict: AssessmentVerdict,
  trueSeconds: number,
  askedSeconds: number,
): string | null {
  if (verdict === 'accepted' && trueSeconds > askedSeconds)
    return `That is more than the ${formatHoursFromSeconds(askedSeconds)} asked: say what should change instead.`
  if (verdict === 'accepted' && trueSeconds === 0) return 'Say how many hours it truly takes.'
  return null
}
