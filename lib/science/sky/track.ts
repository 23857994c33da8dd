import type { Vector3 } from './vector'

/** Lagrange weights of six even points at -2 .. 3 for a fraction f of the step from point 0. */
function weights(f: number): [number, number, number, number, number, number] {
  const a = f + 2
  const b = f + 1
  const d = f - 1
  const e = f - 2
  const g = f - 3
  return [
    (-b * f * d * e * g) / 120,
    (a * f * d * e * g) / 24,
    (-a * b * d * e * g) / 12,
    (a * b * f * e * g) / 12,
    (-a * b * f * d * g) / 24,
    (a * b * f * d * e) / 120,
  ]
}

/** Samples kept before starting afresh, so that a long-lived process does not grow: decades of days. */
const MOST_SAMPLES = 20_000

/**
 * A smooth path in space, sampled on an even grid of times when first needed and read between the samples by
 * six-point interpolation. `stepDays` must be short against the path's periods.
 */
export function createTrack(
  sample: (days: number) => Vector3,
  stepDays: number,
): (days: number) => [number, number, number] {
  const kept = new Map<number, Vector3>()

  function point(index: number): Vector3 {
    const known = kept.get(index)
    if (known) return known
    const made = sample(index * stepDays)
    if (kept.size >= MOST_SAMPLES) kept.clear()
    kept.set(index, made)
    return made
  }

  return (days) => {
    const base = Math.floor(days / stepDays)
    const w = weights(days / stepDays - base)
    const sum: [number, number, number] = [0, 0, 0]
    for (let k = 0; k < 6; k += 1) {
      const p = point(base - 2 + k)
      const weight = w[k] ?? 0
      sum[0] += weight * p[0]
      sum[1] += weight * p[1]
      sum[2] += weight * p[2]
    }
    return sum
  }
}
