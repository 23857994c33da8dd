import type { MoonClass } from '../exposure'
import type { MoonLimits } from '../sky'

/** Largest illuminated fraction of a Moon that is up in a class of moonlight; our own bounds. */
export const moonClassLimits: Readonly<Record<MoonClass, MoonLimits>> = {
  dark: { maxIllumination: 0.25 },
  grey: { maxIllumination: 0.65 },
  bright: {},
}
