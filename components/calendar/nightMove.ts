import type { CalendarNight } from '@/lib/domain/calendar/types'

/** Where a key leads from a night: days sideways, months up and down, the ends of the season by Home and End. */
export function nightMove(
  nights: readonly Pick<CalendarNight, 'date'>[],
  date: string,
  key: string,
): string | null {
  const at = nights.findIndex((night) => night.date === date)
  const first = nights[0]?.date ?? null
  const last = nights.at(-1)?.date ?? null
  const month = (step: number): string | null => {
    const index = Number(date.slice(0, 4)) * 12 + Number(date.slice(5, 7)) - 1 + step
    const name = `${Math.floor(index / 12)}-${String((index % 12) + 1).padStart(2, '0')}`
    const own = nights.filter((night) => night.date.startsWith(name))
    const wanted = `${name}-${date.slice(8)}`
    return own.findLast((night) => night.date <= wanted)?.date ?? own[0]?.date ?? null
  }
  switch (key) {
    case 'ArrowLeft':
      return nights[at - 1]?.date ?? null
    case 'ArrowRight':
      return nights[at + 1]?.date ?? null
    case 'ArrowUp':
      return month(-1)
    case 'ArrowDown':
      return month(1)
    case 'Home':
      return first
    case 'End':
      return last
    default:
      return null
  }
}
