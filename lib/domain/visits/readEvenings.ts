import { z } from 'zod'
import { isCalendarDay } from '../calendarDay'
import type { NightHalf } from './types'

export type EveningHalf = Pick<NightHalf, 'date' | 'half'>

const entry = /^(\d{4}-\d{2}-\d{2})(?:\s+(first|second))?$/
const halfNames = ['first', 'second'] as const

/** Evenings as typed, a comma between them, `first` or `second` behind one for half of its night. */
export const eveningsTyped = z
  .string()
  .trim()
  .max(2000, 'At most 2,000 characters.')
  .transform((text, ctx): EveningHalf[] => {
    const found = new Map<string, EveningHalf>()
    for (const typed of text.split(/[,;\n]/).map((one) => one.trim())) {
      if (typed === '') continue
      const [, date = '', half] = entry.exec(typed) ?? []
      if (!isCalendarDay(date)) {
        ctx.addIssue({
          code: 'custom',
          message: `Give evenings as year-month-day with commas between them: “${typed.slice(0, 40)}” is none.`,
        })
        return z.NEVER
      }
      for (const name of halfNames)
        if (half === undefined || half === name) found.set(`${date} ${name}`, { date, half: name })
    }
    return [...found.values()].sort((a, b) => (`${a.date} ${a.half}` < `${b.date} ${b.half}` ? -1 : 1))
  })

/** Evenings as they are typed. */
export function eveningsText(halves: readonly EveningHalf[]): string {
  const dates = [...new Set(halves.map(({ date }) => date))].sort()
  return dates
    .map((date) => {
      const own = halves.filter((half) => half.date === date)
      return own.length > 1 ? date : `${date} ${own[0]?.half ?? ''}`
    })
    .join(', ')
}
