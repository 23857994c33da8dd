import type { CalendarNight, HalfMonth, UseTotals } from './types'

const half = (date: string) => `${date.slice(0, 7)} ${Number(date.slice(8)) < 16 ? 1 : 2}`

/** Sums of nights by what they are for. */
export function useTotals(nights: readonly Pick<CalendarNight, 'darkSeconds' | 'parts'>[]): UseTotals {
  const parts = nights.flatMap((night) => night.parts)
  const sum = (of: (part: (typeof parts)[number]) => boolean) =>
    parts.reduce((seconds, part) => seconds + (of(part) ? part.darkSeconds : 0), 0)
  const darkSeconds = nights.reduce((seconds, night) => seconds + night.darkSeconds, 0)
  return {
    darkSeconds,
    scienceSeconds: sum(({ useFor }) => useFor === 'science'),
    boundSeconds: sum(({ useFor, instrumentId }) => useFor === 'science' && instrumentId !== null),
    engineeringSeconds: sum(({ useFor }) => useFor === 'engineering'),
    promisedSeconds: sum(({ useFor }) => useFor === 'promised'),
    // Parts are rounded each for itself: a night given away whole is not a second short.
    freeSeconds: Math.max(0, darkSeconds - sum(() => true)),
  }
}

/** Nights in their order, by half-month: the second begins on the 16th. */
export function halfMonths(nights: readonly CalendarNight[]): HalfMonth[] {
  const keys = [...new Set(nights.map(({ date }) => half(date)))]
  return keys.map((key) => {
    const own = nights.filter(({ date }) => half(date) === key)
    return {
      from: own[0]?.date ?? '',
      to: own.at(-1)?.date ?? '',
      nights: own.length,
      ...useTotals(own),
    }
  })
}
