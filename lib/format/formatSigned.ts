import { formatNumber } from './formatNumber'
import { ABSENT } from './glyphs'

/** A change: `+0.25`, `−0.42`, and `0.00` without a sign. */
export function formatSigned(value: number | null | undefined, decimals = 2): string {
  const text = formatNumber(value, decimals)
  if (text === ABSENT || value === null || value === undefined) return text
  return value > 0 && /[1-9]/.test(text) ? `+${text}` : text
}
