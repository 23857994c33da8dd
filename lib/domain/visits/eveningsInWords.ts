import { formatCalendarDate, formatList } from '@/lib/format'
import type { EveningHalf } from './readEvenings'

const dayMs = 86_400_000

type Part = 'whole' | 'first' | 'second'

const begin: Readonly<Record<Part, readonly [one: string, many: string]>> = {
  whole: ['the night of', 'the nights of'],
  first: ['the first half of the night of', 'the first halves of the nights of'],
  second: ['the second half of the night of', 'the second halves of the nights of'],
}

/** `the nights of 3 August 2027 to 5 August 2027 and the first half of the night of 9 August 2027`. */
export function eveningsInWords(halves: readonly EveningHalf[]): string {
  const runs: { part: Part; from: string; to: string }[] = []
  for (const date of [...new Set(halves.map((half) => half.date))].sort()) {
    const own = halves.filter((half) => half.date === date)
    const part: Part = own.length > 1 ? 'whole' : (own[0]?.half ?? 'whole')
    const last = runs.at(-1)
    if (last?.part === part && Date.parse(last.to) + dayMs === Date.parse(date)) last.to = date
    else runs.push({ part, from: date, to: date })
  }
  return formatList(
    runs.map(({ part, from, to }) =>
      from === to
        ? `${begin[part][0]} ${formatCalendarDate(from)}`
        : `${begin[part][1]} ${formatCalendarDate(from)} to ${formatCalendarDate(to)}`,
    ),
  )
}
