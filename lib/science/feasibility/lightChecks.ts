import type { ExposureReport, SiteRecord } from '../exposure'
import { judgeAtLeast, judgeAtMost } from './judge'
import { sayNumber, sayPercent } from './saying'
import type { Check, ReportObservation } from './types'

/** What would help: hours where they do, and not where no time reaches what is wanted. */
function fixOfSignal(reached: ExposureReport | null, refusal: string | null): string {
  if (refusal === null) return 'Ask for more hours, better conditions, or a lower signal-to-noise.'
  return reached
    ? 'Ask for a lower signal-to-noise: no time reaches this one.'
    : 'Put that right at the target or the mode.'
}

/** Is the wanted signal-to-noise reached in the hours asked, overheads taken off? */
export function checkSignal(reached: ExposureReport | null, wanted: number, refusal: string | null): Check {
  const snr = reached?.snr ?? 0
  const isAsked = wanted > 0
  const verdict = isAsked ? judgeAtLeast(snr, wanted * (1 - 1e-9), 0.9 * wanted) : 'not-feasible'
  const frames = reached
    ? `In ${reached.subExposures} sub-exposures of ${sayNumber(reached.subExposureS, 0)}\u00a0s, at the poorest conditions you accept.`
    : 'The hours asked do not cover the overheads.'
  return {
    id: 'signal-to-noise',
    name: 'Signal-to-noise',
    measured: reached ? sayNumber(snr, 1) : 'none',
    feasibleTo: sayNumber(wanted, 1),
    failsAt: sayNumber(0.9 * wanted, 1),
    verdict,
    why: refusal !== null && !(reached && isAsked) ? refusal : frames,
    fix:
      verdict === 'feasible'
        ? null
        : isAsked
          ? fixOfSignal(reached, refusal)
          : 'Give the signal-to-noise you need.',
  }
}

/** Does the brightest pixel stay within what the detector holds? */
export function checkSaturation(report: ExposureReport): Check {
  const verdict = judgeAtMost(report.peakFraction, 0.8, 1)
  return {
    id: 'saturation',
    name: 'Saturation',
    measured: sayPercent(report.peakFraction),
    feasibleTo: '80\u00a0% of full well',
    failsAt: '100\u00a0%',
    verdict,
    why: `The brightest pixel in ${sayNumber(report.subExposureS, report.subExposureS < 10 ? 1 : 0)}\u00a0s.`,
    fix:
      verdict === 'feasible'
        ? null
        : 'Choose a mode with shorter exposures, a higher dispersion or a smaller telescope.',
  }
}

/** Does the site give the image asked for often enough? */
export function checkImage(site: SiteRecord, observation: ReportObservation, deliveredArcsec: number): Check {
  const { best10, median } = site.seeingQuantilesArcsec
  const verdict = judgeAtLeast(observation.seeingArcsec, median, best10)
  return {
    id: 'delivered-image',
    name: 'Image asked for',
    measured: `${sayNumber(observation.seeingArcsec, 2)}″`,
    feasibleTo: `${sayNumber(median, 2)}″, half of all nights`,
    failsAt: `${sayNumber(best10, 2)}″, the best tenth`,
    verdict,
    why: `${sayNumber(observation.seeingArcsec, 2)}″ at the zenith and 500\u00a0nm, ${sayNumber(deliveredArcsec, 2)}″ as delivered here.`,
    fix:
      verdict === 'feasible'
        ? null
        : `Accept ${sayNumber(median, 2)}″, or say why the few better nights are needed.`,
  }
}
