import { z } from 'zod'
import { readNumber } from '@/lib/science/redshift'
import { optionalQuantity } from './quantity'
import type { SiteWeather } from './types'

const twelve = 'Give twelve numbers, January to December, with commas between, such as 12, 13, 16 …'

/** Per cent of the nights lost in each month, as typed: shares out; null where left empty. */
const lostByMonth = z
  .string()
  .trim()
  .max(200, 'At most 200 characters fit here.')
  .transform((text, ctx): number[] | null => {
    if (text === '') return null
    const percents = text.split(/\s*[,;]\s*|\s+/).map(readNumber)
    const say = (message: string) => {
      ctx.addIssue({ code: 'custom', message })
      return z.NEVER
    }
    if (percents.length !== 12) return say(twelve)
    const wrong = percents.findIndex((percent) => percent === null || percent < 0 || percent > 100)
    if (wrong >= 0) return say(`Number ${wrong + 1} of the twelve lies between 0 and 100 %.`)
    return percents.map((percent) => Number(((percent ?? 0) / 100).toPrecision(12)))
  })

/** The weather in the form of a site's record; both left empty where none is on record. */
export const weatherFields = {
  lostByMonth,
  persistence: optionalQuantity({ what: 'A correlation of neighbouring nights', low: 0, high: 0.95 }),
}

interface ReadWeather {
  lostByMonth: number[] | null
  persistence: number | null
}

/** Which of the two is missing, with a sentence; null where they go together. */
export function unfinishedWeather(read: ReadWeather): { path: keyof ReadWeather; message: string } | null {
  if (read.lostByMonth && read.persistence === null)
    return { path: 'persistence', message: 'Give this too: 0 where a night tells nothing of the next.' }
  if (!read.lostByMonth && read.persistence !== null) return { path: 'lostByMonth', message: twelve }
  return null
}

export const weatherFrom = ({ lostByMonth: months, persistence }: ReadWeather): SiteWeather | null =>
  months ? { lostByMonth: months, persistence: persistence ?? 0 } : null
