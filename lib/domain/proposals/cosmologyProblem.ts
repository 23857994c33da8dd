import { ScienceError } from '@/lib/science/ScienceError'
import { createCosmology, findPreset } from '@/lib/science/cosmology'
import type { ChosenCosmology } from './types'

type Parameters = ChosenCosmology['parameters']

const tried = ['H0', 'Om0', 'Ode0', 'w0', 'wa', 'Tcmb0', 'Neff', 'mNuEv'] as const

function refusalOf(parameters: Parameters): string | null {
  try {
    createCosmology(parameters)
    return null
  } catch (error) {
    if (error instanceof ScienceError) return error.message
    throw error
  }
}

/**
 * What the engine says against a set of parameters, and at which of them: the first whose usual value would
 * change its mind. Null when such a universe exists.
 */
export function cosmologyProblem(
  parameters: Parameters,
): { field: keyof Parameters; sentence: string } | null {
  const sentence = refusalOf(parameters)
  if (sentence === null) return null
  const { mNuEv, ...usual } = findPreset('planck-2018').parameters
  const usualValues: Parameters = { ...usual, mNuEv: [...mNuEv] }
  const field = tried.find((name) => refusalOf({ ...parameters, [name]: usualValues[name] }) !== sentence)
  return { field: field ?? 'Om0', sentence }
}
