import { ScienceError } from '../ScienceError'

/** Passes a number on; refuses what ran out of the range of numbers, which only extreme parameters reach. */
export function finite(value: number): number {
  if (Number.isFinite(value)) return value
  throw new ScienceError('outside-range', 'In this model the number asked for is too large to compute.')
}
