import { findPreset, presetCosmology, type Cosmology } from '@/lib/science/cosmology'
import { ScienceError } from '@/lib/science/ScienceError'
import type { YardstickInput } from './schema'

export interface MeasuredUniverse {
  name: string
  sentence: string
  citation: string
  /** Redshift and angular-diameter distance, Mpc. */
  curve: [number, number][]
}

export interface MeasuredRow {
  z: number
  under: ({ luminosityMpc: number; kpcPerArcsec: number; lookbackGyr: number } | null)[]
}

/** Gives null for a redshift the universe does not have; anything else that goes wrong is thrown on. */
function orNone<T>(compute: () => T): T | null {
  try {
    return compute()
  } catch (error) {
    if (error instanceof ScienceError) return null
    throw error
  }
}

function curveOf(cosmology: Cosmology, furthest: number): [number, number][] {
  return Array.from({ length: 121 }, (_, i) => (furthest * i) / 120).flatMap((z): [number, number][] => {
    const distance = orNone(() => cosmology.angularDiameterMpc(z))
    return distance === null ? [] : [[z, distance]]
  })
}

/** Distances, scales and times of the redshifts asked, under each cosmology named. */
export function measure(asked: YardstickInput): {
  redshifts: number[]
  universes: MeasuredUniverse[]
  rows: MeasuredRow[]
} {
  const redshifts = [
    ...new Set(
      asked.z
        .split(/[\s,;]+/)
        .filter(Boolean)
        .map(Number),
    ),
  ]
  const ids = [...new Set([asked.first, asked.second, asked.third])].filter((id) => id !== '')
  const cosmologies = ids.map((id) => presetCosmology(id))
  const furthest = Math.max(1, ...redshifts) * 1.05
  return {
    redshifts,
    universes: cosmologies.map((cosmology, index) => ({
      name: cosmology.parameters.name,
      sentence: cosmology.universe.sentence,
      citation: findPreset(ids[index] ?? '').citation,
      curve: curveOf(cosmology, Math.min(furthest, 1100)),
    })),
    rows: redshifts.map((z) => ({
      z,
      under: cosmologies.map((cosmology) =>
        orNone(() => ({
          luminosityMpc: cosmology.luminosityMpc(z),
          kpcPerArcsec: cosmology.kpcPerArcsec(z),
          lookbackGyr: cosmology.lookbackGyr(z),
        })),
      ),
    })),
  }
}
