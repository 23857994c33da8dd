import { z } from 'zod'
import { readNumber } from '@/lib/science/redshift'

type Read = (text: string) => { ok: true } | { ok: false; message: string }

/** Text that stays text: whether it can be read is said at the field, and the page reads it again. */
export const readable = (read: Read) =>
  z
    .string()
    .trim()
    .max(60)
    .superRefine((text, context) => {
      const answer = read(text)
      if (!answer.ok) context.addIssue({ code: 'custom', message: answer.message })
    })

/** A decimal number as typed, with a point or a comma; null when it is none. */
export const numberOf = (text: string): number | null => readNumber(text.replace(',', '.'))

/** Why a text is no number between two others, in a sentence; null when it is one. */
export function notBetween(what: string, low: number, high: number, text: string): string | null {
  const value = numberOf(text)
  if (value === null) return `${what} is a number.`
  const said = (limit: number) => limit.toLocaleString('en-GB', { maximumFractionDigits: 6 })
  return value >= low && value <= high ? null : `${what} lies between ${said(low)} and ${said(high)}.`
}

export const numberBetween = (what: string, low: number, high: number) =>
  readable((text) => {
    const message = notBetween(what, low, high, text)
    return message === null ? { ok: true } : { ok: false, message }
  })
