import type { StellarMass } from '@/lib/science/cosmology'
import type { YardstickState } from './state'
import { typedQuantity } from './typedQuantity'

/** What is counted, where: an area in square degrees and a density per Mpc^3. */
export interface AskedSurvey {
  areaDeg2: number
  /** Null where only the volume is asked. */
  densityMpc3: number | null
  stellarMass: StellarMass | null
}

export interface SurveyFields {
  /** Null while something cannot be read. */
  survey: AskedSurvey | null
  troubles: { area?: string; density?: string }
}

const WHOLE_SKY_DEG2 = 129_600 / Math.PI
const MOST_MPC3 = 1e6

/** Area and number density as typed, each with the sentence why it cannot be read. */
export function surveyFields({
  area,
  density,
  mass,
}: Pick<YardstickState, 'area' | 'density' | 'mass'>): SurveyFields {
  const troubles: SurveyFields['troubles'] = {}
  const sky = typedQuantity(area, {
    unit: 'deg^2',
    shown: 'square degrees',
    what: 'An area',
    example: '1.5 deg² or 160 arcmin²',
  })
  if (!sky.ok) troubles.area = sky.message
  else if (!(sky.value > 0 && sky.value <= WHOLE_SKY_DEG2 * (1 + 1e-6)))
    troubles.area = 'An area lies above 0 and within 41,252.96 square degrees, the whole sky.'
  const crowd =
    density.trim() === ''
      ? null
      : typedQuantity(density, {
          unit: 'Mpc^-3',
          shown: 'numbers per Mpc³',
          what: 'A number density',
          example: '1e-3 Mpc⁻³',
        })
  if (crowd && !crowd.ok) troubles.density = crowd.message
  else if (crowd?.ok && !(crowd.value >= 0 && crowd.value <= MOST_MPC3))
    troubles.density = 'A number density lies between 0 and 1,000,000 per Mpc³.'
  const isRead = Object.keys(troubles).length === 0 && sky.ok
  return {
    survey: isRead
      ? {
          areaDeg2: sky.value,
          densityMpc3: crowd?.ok ? crowd.value : null,
          stellarMass: mass === 'none' ? null : mass,
        }
      : null,
    troubles,
  }
}
