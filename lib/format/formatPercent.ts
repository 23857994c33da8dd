import { formatNumber } from './formatNumber'
import { ABSENT, NO_BREAK_SPACE } from './glyphs'

/** A share of one as a percentage: 0.81 is `81 %`. */
export function formatPercent(share: number | null | undefined, decimals = 0): string {
  const text = formatNumber(share === null || share === undefined ? share : share * 100, decimals)
  return text === ABSENT ? text : `${text}${NO_BREAK_SPACE}%`
}
