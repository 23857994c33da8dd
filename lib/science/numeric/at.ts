/** The i-th number of a list that is known to be long enough. Throws when it is not, so that a slip never becomes NaN. */
export function at(values: ArrayLike<number>, index: number): number {
  const value = values[index]
  if (value === undefined) throw new RangeError(`No value at index ${index}`)
  return value
}
