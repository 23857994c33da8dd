/**
 * `at` for loops in which each nanosecond counts: given Float64Arrays only, it compiles to a bare load, which
 * the callers of `at`, with arrays of every kind, prevent there.
 */
export function slot(values: Float64Array, index: number): number {
  const value = values[index]
  if (value === undefined) throw new RangeError(`No value at index ${index}`)
  return value
}
