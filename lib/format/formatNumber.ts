import { ABSENT, TRUE_MINUS } from './glyphs'

// Setting one up costs a hundred times what using it does, and a long table shows thousands of numbers.
const formats = new Map<number, Intl.NumberFormat>()

function formatOf(decimals: number): Intl.NumberFormat {
  const known = formats.get(decimals)
  if (known) return known
  const places = { minimumFractionDigits: decimals, maximumFractionDigits: decimals }
  const made = new Intl.NumberFormat('en-GB', places)
  formats.set(decimals, made)
  return made
}

/**
 * A number with fixed decimals, thousands commas and a true minus: `−12,846.2`.
 * What is not finite is shown as absent; a value that rounds to zero has no sign.
 */
export function formatNumber(value: number | null | undefined, decimals = 0): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return ABSENT
  const digits = formatOf(decimals).format(Math.abs(value))
  const isZero = !/[1-9]/.test(digits)
  return value < 0 && !isZero ? `${TRUE_MINUS}${digits}` : digits
}
