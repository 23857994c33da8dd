import { minimum } from '@/lib/science/numeric/minimum'
import type { Design } from './design'
import { mixedFit, type MixedFit } from './mixedFit'

const lowest = -9
const highest = 9
const steps = 72

/**
 * The ratio of variances that maximises the restricted likelihood: a scan in its logarithm, then golden section.
 * A ratio of zero (no merit beyond chance) is a legal answer.
 */
export function remlFit(design: Design): MixedFit | null {
  const deviance = (logRatio: number) =>
    mixedFit(design, Math.exp(logRatio))?.deviance ?? Number.POSITIVE_INFINITY
  const width = (highest - lowest) / steps
  let best = lowest
  let least = Number.POSITIVE_INFINITY
  for (let step = 0; step <= steps; step += 1) {
    const value = deviance(lowest + step * width)
    if (value < least) {
      least = value
      best = lowest + step * width
    }
  }
  const none = mixedFit(design, 0)
  if (none && none.deviance <= least + 1e-9) return none
  if (!Number.isFinite(least)) return none
  return mixedFit(design, Math.exp(minimum(deviance, best - width, best + width)))
}
