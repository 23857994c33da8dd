import { z } from 'zod'
import { formatNumber } from '@/lib/format'
import { readNumber } from '@/lib/science/redshift'

export interface Quantity {
  /** In the messages: `An aperture`. */
  what: string
  low: number
  high: number
  /** Said after the bounds, with its blank where one belongs: ` m`, `″`. */
  unit?: string
  whole?: boolean
}

const bound = (value: number) => {
  const decimals = (String(value).split('.')[1] ?? '').length
  return formatNumber(value, decimals)
}

const tooLong = 'At most 40 characters fit here.'

/** Why a text is not this quantity; null when it is. */
function problemOf(text: string, { what, low, high, unit = '', whole }: Quantity): string | null {
  const value = readNumber(text)
  if (value === null)
    return text.includes(',') ? `${what} is written with a decimal point.` : `${what} is a number.`
  if (value < low || value > high) return `${what} lies between ${bound(low)} and ${bound(high)}${unit}.`
  return whole && !Number.isInteger(value) ? `${what} is a whole number.` : null
}

/** A number typed as text, with its unit and its bounds. */
export function quantity(of: Quantity) {
  return z
    .string()
    .max(40, tooLong)
    .transform((text, ctx): number => {
      const message = text.trim() === '' ? `${of.what} is missing.` : problemOf(text, of)
      if (message === null) return readNumber(text) ?? 0
      ctx.addIssue({ code: 'custom', message })
      return z.NEVER
    })
}

/** The same where it may be left out: null then. */
export function optionalQuantity(of: Quantity) {
  return z
    .string()
    .max(40, tooLong)
    .transform((text, ctx): number | null => {
      if (text.trim() === '') return null
      const message = problemOf(text, of)
      if (message === null) return readNumber(text)
      ctx.addIssue({ code: 'custom', message })
      return z.NEVER
    })
}
