import { ABSENT } from './glyphs'
import { formatNumber } from './formatNumber'

const raised = (exponent: number) =>
  String(exponent)
    .replace('-', '⁻')
    .replace(/\d/g, (digit) => '⁰¹²³⁴⁵⁶⁷⁸⁹'[Number(digit)] ?? '')

/** A number above 0 as a power of ten: 2.5 × 10⁻¹⁷. */
export function formatPower(value: number, decimals = 1): string {
  if (!(value > 0 && value < Infinity)) return ABSENT
  const exponent = Math.floor(Math.log10(value))
  const lead = Number((value / 10 ** exponent).toFixed(decimals))
  // 9.96 rounds up into the next power.
  return lead >= 10
    ? `${formatNumber(1, decimals)} × 10${raised(exponent + 1)}`
    : `${formatNumber(lead, decimals)} × 10${raised(exponent)}`
}
