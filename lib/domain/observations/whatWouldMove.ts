import { formatHoursFromSeconds, formatList, formatNumber } from '@/lib/format'
import type { ModeRecord } from '../facility/types'
import { neededWith } from './change'
import type { ObservationInput } from './computeObservation'
import { needOf } from './needOf'
import { conditionsOf } from './seasonOf'
import type { ObservationComputation } from './types'

/** A saving this small is not worth a sentence. */
const WORTH = 0.9
const tenth = 360

const upToTenth = (seconds: number) => Math.ceil(seconds / tenth - 1e-9) * tenth

/** Other modes on offer of the same kind that reach the same, the shortest first. */
function otherModes(input: ObservationInput, than: number): { mode: ModeRecord; seconds: number }[] {
  const { contents, mode } = input
  return contents.modes
    .filter(({ modeId, kind, band }) => modeId !== mode?.modeId && kind === mode?.kind && band === mode.band)
    .flatMap((other) => {
      const { seconds } = neededWith(input, { mode: other })
      return seconds !== null && seconds < than ? [{ mode: other, seconds }] : []
    })
    .sort((a, b) => a.seconds - b.seconds)
}

function darker(input: ObservationInput, than: number): string[] {
  const { contents, observation } = input
  if (conditionsOf(contents, observation).moon === 'dark') return []
  const { seconds } = neededWith(input, {
    contents: {
      ...contents,
      constraintSets: contents.constraintSets.map((one) => ({ ...one, moon: 'dark' as const })),
    },
  })
  return seconds !== null && seconds < WORTH * than
    ? [`In dark time it takes ${formatHoursFromSeconds(seconds)}.`]
    : []
}

/** Hours of other observations that could be given up, asked for targets that are not required. */
function givenUp({ contents, observation }: ObservationInput, missing: number): string[] {
  const optional = contents.observations.flatMap((one) => {
    const target = contents.targets.find(({ id }) => id === one.targetId)
    // A backup adds no hours that could be given up.
    return one.id !== observation.id &&
      target &&
      needOf(target, contents.groups) === 'optional' &&
      one.askedSeconds >= missing
      ? [{ name: target.name, asked: one.askedSeconds }]
      : []
  })
  const [least] = optional.sort((a, b) => a.asked - b.asked)
  return least
    ? [
        `Leave out ${least.name}, optional: ${formatHoursFromSeconds(missing)} of its ${formatHoursFromSeconds(least.asked)} would cover it.`,
      ]
    : []
}

/**
 * What would have to move for a request that does not fit, as sentences, the nearest first; what could be spared
 * where it fits. Empty when nothing of the kind helps.
 */
export function whatWouldMove(input: ObservationInput, computed: ObservationComputation): string[] {
  const { observation } = input
  const { neededSeconds, snrReached } = computed
  const asked = observation.askedSeconds
  const found: string[] = []
  const most = neededSeconds ?? Infinity
  if (neededSeconds !== null && neededSeconds > asked) {
    const missing = upToTenth(neededSeconds) - asked
    found.push(
      `Ask for ${formatHoursFromSeconds(upToTenth(neededSeconds))}, ${formatHoursFromSeconds(missing)} more.`,
    )
    if (snrReached !== null && snrReached >= 1)
      found.push(`Or be content with S/N ${formatNumber(Math.floor(snrReached * 10) / 10, 1)}.`)
    found.push(...givenUp(input, missing))
  }
  const others = otherModes(input, Number.isFinite(most) ? WORTH * most : Infinity).slice(0, 2)
  if (others.length > 0)
    found.push(
      `Another mode: ${formatList(others.map(({ mode, seconds }) => `${mode.name} takes ${formatHoursFromSeconds(seconds)}`))}.`,
    )
  found.push(...darker(input, most))
  return found
}
