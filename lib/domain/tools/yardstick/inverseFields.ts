import type { InvertibleQuantity } from '@/lib/science/cosmology'
import { formatNumber } from '@/lib/format'
import { MOST_ROWS } from './parseRedshifts'
import { typedQuantity, type Expected } from './typedQuantity'

/** What each quantity is typed as. */
export const expectedOf: Record<InvertibleQuantity, Expected> = {
  lookbackGyr: { unit: 'Gyr', what: 'A time since the light left', example: '8 Gyr' },
  ageGyr: { unit: 'Gyr', what: 'An age', example: '3.3 Gyr' },
  luminosityMpc: { unit: 'Mpc', what: 'A luminosity distance', example: '1.2 Gpc' },
  angularDiameterMpc: { unit: 'Mpc', what: 'An angular-diameter distance', example: '900 Mpc' },
  comovingMpc: { unit: 'Mpc', what: 'A comoving distance', example: '1.2 Gpc' },
  distanceModulusMag: { unit: 'mag', what: 'A distance modulus', example: '44.1 mag' },
}

export interface TypedValue {
  /** As typed. */
  text: string
  /** In the unit of the quantity. */
  value: number
}

/** Values typed one a line (or parted by semicolons), each with or without a unit, and sentences for the rest. */
export function readValues(
  list: string,
  quantity: InvertibleQuantity,
): { values: TypedValue[]; troubles: string[] } {
  const expected = expectedOf[quantity]
  const pieces = list
    .slice(0, 100_000)
    .split(/[\n;]/)
    .map((piece) => piece.trim())
    .filter(Boolean)
  const values: TypedValue[] = []
  const troubles: string[] = []
  for (const text of pieces.slice(0, MOST_ROWS)) {
    const read = typedQuantity(text, expected)
    if (read.ok) values.push({ text, value: read.value })
    else if (troubles.length < 4) troubles.push(`${text.slice(0, 24)}: ${read.message}`)
  }
  if (pieces.length === 0) troubles.push(`${expected.what} is missing: give one such as ${expected.example}.`)
  if (pieces.length > MOST_ROWS)
    troubles.push(
      `${formatNumber(MOST_ROWS)} values are shown and ${formatNumber(pieces.length - MOST_ROWS)} more are not. The public interface at /api/v1/cosmology/inverse takes 100,000 in one call.`,
    )
  return { values, troubles }
}
