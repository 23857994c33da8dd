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

/** How many wrong values are named one by one, so that the answer stays readable. */
const mostNamed = 100

/** What was wrong with some values, each at its place. */
interface Wrong {
  readonly named: Record<string, string>
  count: number
}

/** Computes a list value by value, noting in `wrong` each that the engine refuses. */
function each<T, R>(values: readonly T[], field: string, work: (value: T) => R, wrong: Wrong): R[] {
  const results: R[] = []
  values.forEach((value, index) => {
    try {
      results.push(work(value))
    } catch (error) {
      if (!(error instanceof ScienceError)) throw error
      wrong.count += 1
      if (wrong.count <= mostNamed) wrong.named[`${field}.${index}`] = error.message
    }
  })
  return results
}

/**
 * Computes lists value by value, with the computation each is given. Any value that cannot be fails the whole,
 * and those of all lists are named together: at most the first hundred.
 */
export function eachOrRefused<
  L extends Record<string, readonly [readonly unknown[], (value: never) => unknown]>,
>(lists: L): { [K in keyof L]: L[K] extends readonly [unknown, (value: never) => infer R] ? R[] : never } {
  const wrong: Wrong = { named: {}, count: 0 }
  const total = Object.values(lists).reduce((sum, [values]) => sum + values.length, 0)
  const results = Object.entries(lists).map(([field, [values, work]]) => [
    field,
    each(values as never[], field, work, wrong),
  ])
  if (wrong.count > 0) {
    const more = wrong.count > mostNamed ? ` The first ${mostNamed} are named.` : ''
    throw refuse.invalid(`${wrong.count} of ${total} values cannot be in this model.${more}`, wrong.named)
  }
  return Object.fromEntries(results) as ReturnType<typeof eachOrRefused<L>>
}
