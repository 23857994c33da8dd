import type { ModeRecord } from '../exposure'
import { airToVacuumA, skyLinesA } from '../light'
import { judgeAtLeast } from './judge'
import { sayAngstrom } from './saying'
import { telluricBands } from './telluric'
import type { Check } from './types'

interface Feature {
  readonly name: string
  /** Observed, vacuum. */
  readonly observedA: number
  readonly restA: number
}

/** Ends of a mode's range in vacuum wavelengths. */
export function vacuumRange(
  mode: Pick<ModeRecord, 'wavelengthMinA' | 'wavelengthMaxA' | 'medium'>,
): [number, number] {
  if (mode.medium === 'vacuum') return [mode.wavelengthMinA, mode.wavelengthMaxA]
  return [airToVacuumA(mode.wavelengthMinA), airToVacuumA(mode.wavelengthMaxA)]
}

/** Width over which a feature must be clean: 400 km/s or a resolution element, whichever is wider. */
export function featureWidthA(mode: ModeRecord, observedA: number): number {
  const element = mode.resolvingPower ? observedA / mode.resolvingPower : 0
  return Math.max(element, (observedA * 400) / 299_792.458)
}

/** Does the feature fall where the mode sees? */
export function checkInRange(mode: ModeRecord, feature: Feature): Check {
  const [low, high] = vacuumRange(mode)
  const inside = Math.min(feature.observedA - low, high - feature.observedA)
  const width = featureWidthA(mode, feature.observedA)
  const verdict = judgeAtLeast(inside, width, 0)
  const zLow = Math.max(0, low / feature.restA - 1)
  const zHigh = high / feature.restA - 1
  const range =
    zHigh > 0
      ? `This mode sees ${feature.name} from z = ${zLow.toFixed(2)} to ${zHigh.toFixed(2)}.`
      : `This mode never sees ${feature.name}.`
  return {
    id: 'feature-in-range',
    name: 'Feature in range',
    measured: inside >= 0 ? `${sayAngstrom(inside)} inside` : `${sayAngstrom(-inside)} outside`,
    feasibleTo: `${sayAngstrom(width)}, one line width`,
    failsAt: 'outside',
    verdict,
    why: `${feature.name} at ${sayAngstrom(feature.observedA)}; the mode spans ${sayAngstrom(low)} to ${sayAngstrom(high)} in vacuum.`,
    fix: verdict === 'feasible' ? null : `Choose another mode or another line. ${range}`,
  }
}

/** Is the feature clear of the bands where the air swallows light? */
export function checkClearOfBands(mode: ModeRecord, feature: Feature): Check {
  const width = featureWidthA(mode, feature.observedA)
  const nearest = telluricBands
    .map((band) => ({
      band,
      clear: Math.max(band.fromA - feature.observedA, feature.observedA - band.toA),
    }))
    .reduce((best, next) => (next.clear < best.clear ? next : best))
  const verdict = judgeAtLeast(nearest.clear, 2 * width, width)
  const { band, clear } = nearest
  const edges = `${sayAngstrom(band.fromA)} to ${sayAngstrom(band.toA)}`
  return {
    id: 'clear-of-bands',
    name: 'Clear of telluric bands',
    measured: clear >= 0 ? sayAngstrom(clear) : 'inside a band',
    feasibleTo: `${sayAngstrom(2 * width)}, two line widths`,
    failsAt: `${sayAngstrom(width)}, one`,
    verdict,
    why:
      clear >= 0
        ? `The nearest is ${band.name}, ${edges}.`
        : `${feature.name} falls in ${band.name}, ${edges}.`,
    fix:
      verdict === 'feasible'
        ? null
        : 'Measure another line as well, or take a telluric standard close in time.',
  }
}

/** Is the core of the feature clear of the bright lines of the night sky? They can be subtracted, at a price in noise. */
export function checkClearOfSkyLines(mode: ModeRecord, feature: Feature): Check {
  const element = mode.resolvingPower ? feature.observedA / mode.resolvingPower : 0
  const nearest = skyLinesA.reduce((best, line) =>
    Math.abs(line - feature.observedA) < Math.abs(best - feature.observedA) ? line : best,
  )
  const away = Math.abs(nearest - feature.observedA)
  const verdict = judgeAtLeast(away, element, 0)
  return {
    id: 'clear-of-sky-lines',
    name: 'Clear of sky lines',
    measured: sayAngstrom(away),
    feasibleTo: `${sayAngstrom(element)}, one resolution element`,
    failsAt: 'never',
    verdict,
    why: `The nearest bright line of the night sky is at ${sayAngstrom(nearest)}.`,
    fix:
      verdict === 'feasible'
        ? null
        : 'The core sits on a sky line: plan for more frames, or measure another line as well.',
  }
}
