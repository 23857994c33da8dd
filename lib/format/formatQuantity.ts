import { formatNumber } from './formatNumber'
import { ABSENT, NO_BREAK_SPACE } from './glyphs'

/** A number and its unit, kept together by a no-break space: `12,846.2 Mpc`. */
export function formatQuantity(value: number | null | undefined, decimals: number, unit: string): string {
  const text = formatNumber(value, decimals)
  return text === ABSENT ? text : `${text}${NO_BREAK_SPACE}${unit}`
}
