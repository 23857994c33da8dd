import { formatMoney } from './formatMoney'
import { formatNumber } from './formatNumber'
import { NO_BREAK_SPACE } from './glyphs'
import { minorDigits } from './minorDigits'

/** Money in running text and on buttons: whole amounts lose their zeros, `EUR 120`. */
export function formatMoneyShort(minorUnits: number, currency: string): string {
  const unit = 10 ** minorDigits(currency)
  if (minorUnits % unit !== 0) return formatMoney(minorUnits, currency)
  return `${currency.toUpperCase()}${NO_BREAK_SPACE}${formatNumber(minorUnits / unit)}`
}
