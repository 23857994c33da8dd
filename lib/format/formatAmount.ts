import { formatNumber } from './formatNumber'
import { minorDigits } from './minorDigits'

/** The amount alone, for a column whose head names the currency: `120.00`. */
export function formatAmount(minorUnits: number | null | undefined, currency: string): string {
  const digits = minorDigits(currency)
  return formatNumber(
    minorUnits === null || minorUnits === undefined ? minorUnits : minorUnits / 10 ** digits,
    digits,
  )
}
