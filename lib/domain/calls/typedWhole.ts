import { z } from 'zod'
import { formatNumber } from '@/lib/format'

const read = (text: string) => text.trim().replace(/,/g, '')

/** A whole number as typed, thousands with or without a comma. */
export function typedWhole(what: string, low: number, high: number) {
  const sentence = `${what} is a whole number from ${formatNumber(low, 0)} to ${formatNumber(high, 0)}.`
  return z
    .string()
    .refine(
      (text) => /^\d{1,9}$/.test(read(text)) && Number(read(text)) >= low && Number(read(text)) <= high,
      sentence,
    )
    .transform((text) => Number(read(text)))
}

/** The same, or nothing: no limit. */
export function typedWholeOrNone(what: string, low: number, high: number) {
  const number = typedWhole(what, low, high)
  return z.string().transform((text, context): number | null => {
    if (read(text) === '') return null
    const result = number.safeParse(text)
    if (result.success) return result.data
    context.addIssue({ code: 'custom', message: result.error.issues[0]?.message ?? what })
    return z.NEVER
  })
}
