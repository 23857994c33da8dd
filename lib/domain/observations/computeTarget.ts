import { ScienceError } from '@/lib/science/ScienceError'
import type { Cosmology } from '@/lib/science/cosmology'
import type { TargetVisibility } from '@/lib/science/sky'
import type { Target } from '../proposals/types'
import { hoursByMonth } from './hoursByMonth'
import type { TargetComputation } from './types'

/** A redshift of exactly 0 has no modulus; everything else it has. */
const modulus = (cosmology: Cosmology, z: number) => (z > 0 ? cosmology.distanceModulusMag(z) : null)

/** Age is null in a universe without a beginning. */
function age(cosmology: Cosmology, z: number): number | null {
  try {
    return cosmology.ageGyr(z)
  } catch (error) {
    if (error instanceof ScienceError && error.code === 'no-beginning') return null
    throw error
  }
}

const noDistances = {
  luminosityMpc: null,
  angularDiameterMpc: null,
  comovingMpc: null,
  kpcPerArcsec: null,
  distanceModulusMag: null,
  lookbackGyr: null,
  ageGyr: null,
}

function distances(cosmology: Cosmology, z: number) {
  return {
    luminosityMpc: cosmology.luminosityMpc(z),
    angularDiameterMpc: cosmology.angularDiameterMpc(z),
    comovingMpc: cosmology.comovingMpc(z),
    kpcPerArcsec: cosmology.kpcPerArcsec(z),
    distanceModulusMag: modulus(cosmology, z),
    lookbackGyr: cosmology.lookbackGyr(z),
    ageGyr: age(cosmology, z),
  }
}

function comparisonAt(cosmology: Cosmology | null, z: number | null): TargetComputation['comparison'] {
  if (!cosmology || z === null) return null
  try {
    return {
      luminosityMpc: cosmology.luminosityMpc(z),
      kpcPerArcsec: cosmology.kpcPerArcsec(z),
      lookbackGyr: cosmology.lookbackGyr(z),
    }
  } catch (error) {
    if (error instanceof ScienceError) return null
    throw error
  }
}

export interface TargetInput {
  target: Target
  cosmology: Cosmology
  comparison: Cosmology | null
  /** Hours up through the season; null while the target has no position. */
  visible: TargetVisibility | null
  /** Evening dates of the season. */
  dates: readonly string[]
}

/** Distances, scale and times of one target, and its dark hours. What a cosmology refuses is said in words. */
export function computeTarget({
  target,
  cosmology,
  comparison,
  visible,
  dates,
}: TargetInput): TargetComputation {
  let refusal: string | null = null
  let numbers: ReturnType<typeof distances> | typeof noDistances = noDistances
  if (target.redshift !== null) {
    try {
      numbers = distances(cosmology, target.redshift)
    } catch (error) {
      if (!(error instanceof ScienceError)) throw error
      refusal = error.message
    }
  }
  return {
    targetId: target.id,
    ...numbers,
    visibleHours: visible ? visible.totalHours : null,
    visibleHoursByMonth: visible ? hoursByMonth(dates, visible.byNight) : [],
    visibleHoursByNight: visible ? visible.byNight : [],
    refusal,
    comparison: comparisonAt(comparison, target.redshift),
  }
}
