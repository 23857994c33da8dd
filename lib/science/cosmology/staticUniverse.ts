import { GRAVITATION_SI, GYR_S, SPEED_OF_LIGHT_KM_S } from '../constants'
import { ScienceError } from '../ScienceError'
import type { Moment } from './expansionHistory'

const C = SPEED_OF_LIGHT_KM_S * 1e3

/** The one universe of matter and a cosmological constant that stands still. SI units. */
export interface StaticUniverse {
  readonly densityKgM3: number
  /** 4 pi G rho / c^2. */
  readonly lambdaPerM2: number
  /** Radius of its closed space, 1/sqrt(Lambda). */
  readonly radiusM: number
  /** Left-over of the first Friedmann equation, H^2 in s^-2: 0 to rounding. */
  readonly expansionPerS2: number
  /** Left-over of the second, (d2a/dt2)/a in s^-2: 0 to rounding. */
  readonly accelerationPerS2: number
  /** Rate at which any disturbance grows: sqrt(Lambda) c. */
  readonly growthPerGyr: number
}

/**
 * The static solution for a density of matter without pressure: Lambda = 4 pi G rho/c^2 and a curvature
 * k = Lambda a^2 > 0 (Einstein 1917; its instability: Eddington 1930, MNRAS 90, 668).
 */
export function staticUniverse(densityKgM3: number): StaticUniverse {
  if (!(densityKgM3 > 0 && Number.isFinite(densityKgM3)))
    throw new ScienceError('bad-parameter', 'The density of a static universe must be above 0 kg/m³.')
  const gravity = 4 * Math.PI * GRAVITATION_SI * densityKgM3
  const lambdaPerM2 = gravity / (C * C)
  const radiusM = 1 / Math.sqrt(lambdaPerM2)
  const repulsion = (lambdaPerM2 * C * C) / 3
  return {
    densityKgM3,
    lambdaPerM2,
    radiusM,
    expansionPerS2: (2 * gravity) / 3 - (C / radiusM) ** 2 + repulsion,
    accelerationPerS2: repulsion - gravity / 3,
    growthPerGyr: Math.sqrt(lambdaPerM2) * C * GYR_S,
  }
}

/** Size past which a run from the static state is over. */
const SMALLEST = 1e-3
const LARGEST = 1e3

/**
 * What becomes of the static universe when its density at rest is off by `contrast`: size against time, from
 * d2a/dt2 = omega^2/3 (a - (1 + contrast)/a^2) with omega = sqrt(Lambda) c, by fourth-order Runge-Kutta steps.
 * Too dense it falls together, too thin it runs away; at first as 1 + contrast/3 (1 - cosh omega t).
 * `gyrFromNow` counts from the disturbance. Ends early where the size leaves 0.001 to 1000.
 */
export function disturbStatic(
  universe: StaticUniverse,
  contrast: number,
  overGyr: number,
  points: number,
): Moment[] {
  if (!(Math.abs(contrast) < 1))
    throw new ScienceError('bad-parameter', 'The contrast of density lies between −1 and 1.')
  if (!(overGyr > 0 && Number.isFinite(overGyr) && Number.isInteger(points) && points >= 2 && points <= 1e5))
    throw new ScienceError('bad-parameter', 'Give a time above 0 Gyr, in 2 to 100 000 points.')
  const third = universe.growthPerGyr ** 2 / 3
  const pull = (a: number): number => third * (a - (1 + contrast) / (a * a))
  const moments: Moment[] = [{ gyrFromNow: 0, scaleFactor: 1 }]
  const interval = overGyr / (points - 1)
  // A five-hundredth of the growth time: the error of a step is of its fifth power.
  const steps = Math.ceil((interval * universe.growthPerGyr) / 0.002)
  if (steps * points > 2e7)
    throw new ScienceError('bad-parameter', 'This is too many growth times to follow.')
  const h = interval / steps
  let a = 1
  let speed = 0
  for (let i = 1; i < points; i += 1) {
    for (let j = 0; j < steps && a > SMALLEST && a < LARGEST; j += 1) {
      const k1 = pull(a)
      const k2 = pull(a + (h / 2) * speed)
      const k3 = pull(a + (h / 2) * speed + ((h * h) / 4) * k1)
      const k4 = pull(a + h * speed + ((h * h) / 2) * k2)
      a += h * speed + ((h * h) / 6) * (k1 + k2 + k3)
      speed += (h / 6) * (k1 + 2 * k2 + 2 * k3 + k4)
    }
    if (!(a > SMALLEST && a < LARGEST)) break
    moments.push({ gyrFromNow: i * interval, scaleFactor: a })
  }
  return moments
}
