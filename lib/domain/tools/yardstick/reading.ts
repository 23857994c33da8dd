import type { Cosmology, CosmologyQuantity } from '@/lib/science/cosmology'
import { formatNumber } from '@/lib/format'
import { ScienceError } from '@/lib/science/ScienceError'

/** One quantity at one redshift: its value, or why there is none, in a few words and in a sentence. */
export type Reading =
  { value: number; absent: null } | { value: null; absent: { words: string; sentence: string } }

const at = (z: number) => `z = ${formatNumber(z, Math.abs(z) < 0.1 ? 4 : 2)}`

/** What a cell says where a universe has no such value. */
function wordsOf(error: ScienceError, cosmology: Cosmology, z: number): string {
  const { universe, antipodeRedshift } = cosmology
  if (error.code === 'past-the-turn')
    return `does not exist: past the turn at ${at(universe.turnaroundRedshift ?? cosmology.deepestRedshift)}`
  if (error.code === 'past-the-antipode') return `past the antipode at ${at(antipodeRedshift ?? z)}`
  if (error.code === 'no-beginning') return 'no big bang'
  if (z < 0) return 'in the future: no distance'
  return z === 0 ? 'none at z = 0' : 'beyond the engine'
}

/** Exactly at a turn the expansion stands still, and what is divided by its rate has no value. */
const atTheTurn = {
  words: 'none at the turn',
  sentence: 'Here the expansion stands still, and what is measured against its rate has no value.',
}

/** Reads one quantity; what a universe does not have becomes words, anything else that goes wrong is thrown on. */
export function readQuantity(cosmology: Cosmology, quantity: CosmologyQuantity, z: number): Reading {
  try {
    const value = cosmology[quantity](z)
    return Number.isFinite(value) ? { value, absent: null } : { value: null, absent: atTheTurn }
  } catch (error) {
    if (!(error instanceof ScienceError)) throw error
    return { value: null, absent: { words: wordsOf(error, cosmology, z), sentence: error.message } }
  }
}
