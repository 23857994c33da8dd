import { ScienceError } from '@/lib/science/ScienceError'
import { refuse } from '@/lib/errors'

/** Runs a calculation; what the engine refuses is told at `field`, in its own sentence. */
export function asRefused<T>(field: string, work: () => T): T {
  try {
    return work()
  } catch (error) {
    if (error instanceof ScienceError) throw refuse.field(field, error.message)
    throw error
  }
}

/**
 * Computes a list value by value. Any value that cannot be fails the whole, and each is named: at most the first
 * hundred, so that the answer stays readable.
 */
export function eachOrRefused<T, R>(values: readonly T[], field: string, work: (value: T) => R): R[] {
  const wrong: Record<string, string> = {}
  let count = 0
  const results: R[] = []
  values.forEach((value, index) => {
    try {
      results.push(work(value))
    } catch (error) {
      if (!(error instanceof ScienceError)) throw error
      count += 1
      if (count <= 100) wrong[`${field}.${index}`] = error.message
    }
  })
  if (count > 0) throw refuse.invalid(`${count} of ${values.length} values cannot be in this model.`, wrong)
  return results
}
