import type { MoonClass } from '../exposure'
import type { TargetVisibility } from '../sky'
import { judgeAtLeast, judgeAtMost } from './judge'
import { limitWords } from './limitWords'
import { sayHours, sayNumber, sayPercent } from './saying'
import { neverUp } from './neverUp'
import type { SeasonVisibility } from './seasonVisibility'
import type { Check, ReportInput, ReportObservation } from './types'

const moonWords: Record<MoonClass, string> = {
  dark: 'with the Moon down or a quarter lit at most',
  grey: 'with the Moon down or two thirds lit at most',
  bright: 'with any Moon',
}

function nightsUp(visible: TargetVisibility): number {
  return visible.byNight.filter((hours) => hours > 0).length
}

/** Is the target up in the dark for at least twice the hours asked? */
export function checkUp({ visible, nights, isEverDark }: SeasonVisibility, input: ReportInput): Check {
  const { site, pointing, target, observation } = input
  const words = limitWords(pointing)
  const limits = words && `${words},`
  const asked = observation.askedS / 3600
  const verdict = judgeAtLeast(visible.totalHours, 2 * asked, Math.max(asked, 1e-9))
  const up = nightsUp(visible)
  const { raDeg, decDeg } = target
  const never =
    up === 0 && raDeg !== null && decDeg !== null
      ? neverUp({ site, pointing, raDeg, decDeg, maxAirmass: observation.maxAirmass, isEverDark })
      : null
  return {
    id: 'up-in-the-dark',
    name: 'Up in the dark',
    measured: sayHours(visible.totalHours * 3600),
    feasibleTo: `${sayHours(2 * observation.askedS)}, twice asked`,
    failsAt: sayHours(observation.askedS),
    verdict,
    why:
      never?.why ??
      `Above airmass ${observation.maxAirmass}${limits} on ${up === nights ? `all ${nights}` : `${up} of ${nights}`} nights.`,
    fix: verdict === 'feasible' ? null : (never?.fix ?? 'Accept a larger airmass, or ask in another season.'),
  }
}

/** And within the Moon limits of the request? */
export function checkUpWithMoon(usableHours: number, observation: ReportObservation): Check {
  const asked = observation.askedS / 3600
  const verdict = judgeAtLeast(usableHours, 2 * asked, Math.max(asked, 1e-9))
  return {
    id: 'hours-with-moon',
    name: 'Hours within the Moon limit',
    measured: sayHours(usableHours * 3600),
    feasibleTo: `${sayHours(2 * observation.askedS)}, twice asked`,
    failsAt: sayHours(observation.askedS),
    verdict,
    why: `Hours up in the dark ${moonWords[observation.moon]}.`,
    fix: verdict === 'feasible' ? null : 'Accept a brighter Moon, or a smaller distance from it.',
  }
}

/** Do the hours asked cover the open shutter and its overheads? */
export function checkHoursAsked(askedS: number, neededS: number, openS: number): Check {
  const verdict = judgeAtLeast(askedS, neededS, 0.9 * neededS)
  return {
    id: 'hours-asked',
    name: 'Hours asked',
    measured: sayHours(askedS),
    feasibleTo: `${sayHours(neededS)}, as needed`,
    failsAt: `${sayHours(0.9 * neededS)}, 90\u00a0%`,
    verdict,
    why: `${sayNumber(openS / 3600, 2)}\u00a0h open shutter and ${sayNumber((neededS - openS) / 3600, 2)}\u00a0h of overheads.`,
    fix:
      verdict === 'feasible'
        ? null
        : `Ask for ${sayHours(Math.ceil(neededS / 360) * 360)}, or a lower signal-to-noise.`,
  }
}

/** Is more asked than the measurement needs? */
export function checkNotOverAsked(askedS: number, neededS: number): Check {
  const share = askedS / neededS
  const verdict = judgeAtMost(share, 1.15, 1.5)
  return {
    id: 'not-over-asked',
    name: 'Not over-asked',
    measured: sayPercent(share),
    feasibleTo: '115\u00a0% of needed',
    failsAt: '150\u00a0%',
    verdict,
    why: `${sayHours(askedS)} asked for ${sayHours(neededS)} needed.`,
    fix:
      verdict === 'feasible'
        ? null
        : `Ask for ${sayHours(Math.ceil(neededS / 360) * 360)}, or a higher signal-to-noise.`,
  }
}
