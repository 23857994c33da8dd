import { formatCalendarDate } from '@/lib/format'
import type { NightBin } from '@/lib/panel/nights/binTypes'
import { eveningAfter } from '../calls/evenings'
import type { Pressure } from './types'

type Named = readonly [key: string, name: string]

function summed(
  classes: readonly Named[],
  bins: readonly NightBin[],
  asked: readonly number[],
  keyOf: (bin: NightBin) => string,
): Pressure[] {
  return classes.map(([key, name]) => {
    const own = bins.flatMap((bin, index) => (keyOf(bin) === key ? [index] : []))
    return {
      name,
      askedSeconds: own.reduce((sum, index) => sum + (asked[index] ?? 0), 0),
      offeredSeconds: own.reduce((sum, index) => sum + (bins[index]?.seconds ?? 0), 0),
    }
  })
}

/** Half-months of a season, counted from its first, in words: `1 to 15 August`. */
function halfNames(from: string, to: string): Named[] {
  const names: Named[] = []
  for (let date = from; date <= to;) {
    const isFirst = Number(date.slice(8)) < 16
    const monthEnd = new Date(Date.UTC(Number(date.slice(0, 4)), Number(date.slice(5, 7)), 0))
    const end = isFirst ? `${date.slice(0, 8)}15` : monthEnd.toISOString().slice(0, 10)
    const last = end < to ? end : to
    names.push([String(names.length), `${Number(date.slice(8))} to ${formatCalendarDate(last, false)}`])
    date = eveningAfter(end, 1)
  }
  return names
}

const hour = (h: number) => `${String(h).padStart(2, '0')} h`

/** Pressure by half-month, by sidereal time and by moonlight: what is asked there against what is on offer there. */
export function pressuresOf(
  bins: readonly NightBin[],
  asked: readonly number[],
  season: { from: string; to: string },
): Record<'byHalfMonth' | 'bySidereal' | 'byMoon', Pressure[]> {
  const sidereal = Array.from({ length: 12 }, (_, i): Named => [
    String(2 * i),
    `${hour(2 * i)} to ${hour((2 * i + 2) % 24)}`,
  ])
  const moons: Named[] = [
    ['dark', 'Dark'],
    ['grey', 'Grey'],
    ['bright', 'Bright'],
  ]
  return {
    byHalfMonth: summed(halfNames(season.from, season.to), bins, asked, ({ half }) => String(half)),
    bySidereal: summed(sidereal, bins, asked, ({ siderealFromH }) => String(siderealFromH)),
    byMoon: summed(moons, bins, asked, ({ moon }) => moon),
  }
}
