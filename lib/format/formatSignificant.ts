import { formatNumber } from './formatNumber'
import { NO_BREAK_SPACE, TRUE_MINUS } from './glyphs'

const superscripts: Record<string, string> = {
  '-': '⁻',
  '0': '⁰',
  '1': '¹',
  '2': '²',
  '3': '³',
  '4': '⁴',
  '5': '⁵',
  '6': '⁶',
  '7': '⁷',
  '8': '⁸',
  '9': '⁹',
}

/**
 * A number to at least so many significant figures (whole digits are never rounded away); very large and very
 * small ones as `8.0 × 10⁻¹⁶`.
 * The plain form is kept from 0.001 to a million, where people read it faster.
 */
export function formatSignificant(value: number | null | undefined, figures = 3): string {
  if (value === null || value === undefined || !Number.isFinite(value) || value === 0)
    return formatNumber(value, 0)
  const exponent = Math.floor(Math.log10(Math.abs(value)))
  if (exponent >= -3 && exponent < 6) return formatNumber(value, Math.max(0, figures - 1 - exponent))
  const [mantissa = '', power = '0'] = value.toExponential(figures - 1).split('e')
  const raised = [...power.replace('+', '')].map((digit) => superscripts[digit] ?? digit).join('')
  return `${mantissa.replace('-', TRUE_MINUS)}${NO_BREAK_SPACE}×${NO_BREAK_SPACE}10${raised}`
}
