import { readNumber } from '@/lib/science/redshift'
import { formatNumber } from '@/lib/format'
import { typedText } from './typedText'

const shown = (bound: number) => formatNumber(bound, Number.isInteger(bound) ? 0 : 2)

/** A plain number between two bounds, typed as text; `what` names it in the messages: 'A proper motion'. */
export function typedNumber(what: string, low: number, high: number) {
  return typedText((text) => {
    const value = readNumber(text)
    if (value === null) return { ok: false, message: `${what} is a number.` }
    if (value < low || value > high)
      return { ok: false, message: `${what} lies between ${shown(low)} and ${shown(high)}.` }
    return { ok: true, value }
  })
}
