import { minorDigits } from '@/lib/format/minorDigits'

/** An amount as typed, in minor units of the currency, or a sentence that says why it is none. */
export function moneyAmount(text: string, currency: string): number | string {
  const digits = minorDigits(currency)
  const bare = text.trim().replace(/^[A-Z]{3}\s+/, (code) => (code.trim() === currency ? '' : code))
  if (/^[A-Z]{3}\b/.test(bare)) return `The call's fees are in ${currency}, not in ${bare.slice(0, 3)}.`
  if (/^[-−]/.test(bare)) return 'An amount is never negative.'
  if (!/^\d{1,7}(\.\d+)?$/.test(bare))
    return digits > 0
      ? 'Write the amount in figures with a point: 120 or 120.00.'
      : 'Write the amount in whole figures: 120.'
  const [whole = '0', part = ''] = bare.split('.')
  if (part.length > digits)
    return digits === 0
      ? `${currency} has no smaller unit: write a whole amount.`
      : `${currency} has ${digits === 2 ? 'two' : String(digits)} decimals at most.`
  return Number(whole) * 10 ** digits + Number(part.padEnd(digits, '0') || '0')
}
