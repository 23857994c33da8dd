import { ABSENT, TRUE_MINUS } from './glyphs'

/**
 * A number with fixed decimals, thousands commas and a true minus: `−12,846.2`.
 * What is not finite is shown as absent; a value that rounds to zero has no sign.
 */
export function formatNumber(value: number | null | undefined, decimals = 0): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return ABSENT
  const digits = Math.abs(value).toLocaleString('en-GB', {
    minimumFractionDigits: decimals,
    maximumFractionDigits: decimals,
  })
  const isZero = !/[1-9]/.test(digits)
  return value < 0 && !isZero ? `${TRUE_MINUS}${digits}` : digits
}
