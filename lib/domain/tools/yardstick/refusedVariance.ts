import { cosmicVariance } from '@/lib/science/cosmology'
import { ScienceError } from '@/lib/science/ScienceError'
import { shellsOf } from './sheets/surveySheet'
import type { AskedSurvey } from './surveyFields'

/** Why the clustering of the first shell for which it is not known is not; null where it is for all. */
export function refusedVariance(
  { areaDeg2, stellarMass }: AskedSurvey,
  redshifts: readonly number[],
): string | null {
  if (!stellarMass) return null
  for (const shell of shellsOf(redshifts))
    try {
      cosmicVariance({ areaDeg2, stellarMass, ...shell })
    } catch (error) {
      if (error instanceof ScienceError) return error.message
      throw error
    }
  return null
}
