import { at } from '../numeric/at'
import { ScienceError } from '../ScienceError'

/** A table against wavelength, angstroms, growing. */
export interface Table {
  readonly wavelengthsA: readonly number[]
  readonly values: readonly number[]
}

/** Throws a ScienceError unless the rows grow in wavelength and hold no negative value; `what` names the table. */
export function checkTable(table: Table, what: string): void {
  const { wavelengthsA, values } = table
  if (wavelengthsA.length < 2 || wavelengthsA.length !== values.length)
    throw new ScienceError(
      'bad-source',
      `${what} needs two rows at least, each with a wavelength and a value.`,
    )
  for (let i = 0; i < values.length; i += 1) {
    if (i > 0 && !(at(wavelengthsA, i) > at(wavelengthsA, i - 1)))
      throw new ScienceError(
        'bad-source',
        `The wavelengths of ${what.toLowerCase()} must grow from row to row.`,
      )
    if (!(at(values, i) >= 0 && at(values, i) < Infinity))
      throw new ScienceError('bad-source', `The values of ${what.toLowerCase()} must be 0 or more.`)
  }
}

/** The value of a table at a wavelength, straight between rows, 0 outside. */
export function readTable({ wavelengthsA, values }: Table, wavelengthA: number): number {
  const last = wavelengthsA.length - 1
  if (wavelengthA < at(wavelengthsA, 0) || wavelengthA > at(wavelengthsA, last)) return 0
  let low = 0
  let high = last
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if (at(wavelengthsA, middle) <= wavelengthA) low = middle
    else high = middle
  }
  const t = (wavelengthA - at(wavelengthsA, low)) / (at(wavelengthsA, high) - at(wavelengthsA, low))
  return at(values, low) + t * (at(values, high) - at(values, low))
}
