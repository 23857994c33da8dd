import type { ModeRecord } from '../exposure'
import { vacuumRange } from './featureChecks'
import { judgeAtLeast } from './judge'
import { sayNumber, sayPercent } from './saying'
import { telluricBands } from './telluric'
import type { Check } from './types'

/** Standard deviations of the redshift that are looked through on either side, and steps a deviation. */
const REACH = 5
const STEPS = 40
const SURE = 0.95
const FAIR = 0.68

/**
 * Share of a Gaussian P(z) for which a feature of rest wavelength `restA` (vacuum, angstroms) falls inside a mode's
 * range and outside the bands where the air swallows light; redshifts below 0 count as outside.
 */
export function cleanShare(mode: ModeRecord, restA: number, z: number, sigma: number): number {
  const [low, high] = vacuumRange(mode)
  let clean = 0
  let whole = 0
  for (let i = -REACH * STEPS; i <= REACH * STEPS; i += 1) {
    const deviation = i / STEPS
    const weight = Math.exp(-0.5 * deviation * deviation)
    const redshift = z + deviation * sigma
    const observedA = restA * (1 + redshift)
    const isInside = redshift >= 0 && observedA >= low && observedA <= high
    const isDimmed = telluricBands.some(({ fromA, toA }) => observedA >= fromA && observedA <= toA)
    whole += weight
    if (isInside && !isDimmed) clean += weight
  }
  return clean / whole
}

/** With a redshift that is not measured from lines: how likely is it that the feature is seen at all, and clean? */
export function checkLikelyInRange(
  mode: ModeRecord,
  feature: { readonly name: string; readonly restA: number },
  redshift: { readonly z: number; readonly error: number; readonly type: 'photometric' | 'assumed' },
): Check {
  const share = cleanShare(mode, feature.restA, redshift.z, redshift.error)
  const verdict = judgeAtLeast(share, SURE, FAIR)
  return {
    id: 'feature-likely',
    name: 'Feature likely seen',
    measured: sayPercent(share),
    feasibleTo: sayPercent(SURE),
    failsAt: sayPercent(FAIR),
    verdict,
    why: `Share of a ${redshift.type} redshift of ${sayNumber(redshift.z, 2)} ± ${sayNumber(redshift.error, 2)} for which ${feature.name} is in range and clear of bands.`,
    fix:
      verdict === 'feasible'
        ? null
        : 'Measure the redshift first, choose a mode with a wider range, or a second feature that is seen where this is not.',
  }
}
