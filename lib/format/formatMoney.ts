import { formatNumber } from './formatNumber'
import { minorDigits } from './minorDigits'
import { NO_BREAK_SPACE } from './glyphs'

/** Money from its minor units, currency first: 12,000 of EUR is `EUR 120.00`. */
export function formatMoney(minorUnits: number, currency: string): string {
  const digits = minorDigits(currency)
  return `${currency.toUpperCase()}${NO_BREAK_SPACE}${formatNumber(minorUnits / 10 ** digits, digits)}`
}
