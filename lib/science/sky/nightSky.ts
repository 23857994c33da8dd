import type { Almanac } from './almanac'
import { intervalsAbove, type Interval } from './intervals'
import { moonIllumination } from './moonIllumination'
import type { Observer } from './observer'
import { dateOf, midnightOf } from './time'
import type { Night, Twilight } from './types'

/** Samples of the Sun through a day: half-hourly, plus local mean midnight. */
const SAMPLES = 48
/** Altitude of the Sun's centre at sunset: 34' of refraction and 16' of radius. */
const SUNSET_DEG = -50 / 60

/** Nights kept before starting afresh. */
const MOST_NIGHTS = 10_000

/** One night at a site in days since J2000, with what its windows are cut from. */
export interface NightSky {
  readonly date: string
  /** Local mean noon before and after. */
  readonly noons: Interval
  readonly middle: number
  /** Sun's centre below -50'. */
  readonly sunDown: readonly Interval[]
  readonly moonUp: readonly Interval[]
  /** Sun below an altitude, degrees. */
  darkness(limitDeg: number): Interval[]
}

function computeNightSky(observer: Observer, almanac: Almanac, date: string): NightSky {
  // Noon by the site's own longitude, so that a night never splits between two dates.
  const longitude = ((observer.site.longitudeDeg + 540) % 360) - 180
  const noon = midnightOf(date) + 0.5 - longitude / 360
  const times = Array.from({ length: SAMPLES + 1 }, (_, i) => noon + i / SAMPLES)
  const sunAltitude = (days: number): number =>
    observer.altitudeDeg(observer.topocentric(almanac.sun(days), days), days)
  const moonAltitude = (days: number): number =>
    observer.altitudeDeg(observer.topocentric(almanac.moon(days), days), days)
  const sunValues = times.map(sunAltitude)
  const known = new Map<number, Interval[]>()
  const darkness = (limitDeg: number): Interval[] => {
    const dark =
      known.get(limitDeg) ??
      intervalsAbove(
        (days) => limitDeg - sunAltitude(days),
        times,
        sunValues.map((altitude) => limitDeg - altitude),
      )
    known.set(limitDeg, dark)
    return dark
  }
  return {
    date,
    noons: [noon, noon + 1],
    middle: noon + 0.5,
    sunDown: darkness(SUNSET_DEG),
    moonUp: intervalsAbove(moonAltitude, times),
    darkness,
  }
}

const kept = new WeakMap<Almanac, Map<string, NightSky>>()

/** Sun and Moon through one night, computed once for a site and almanac. */
export function createNightSky(observer: Observer, almanac: Almanac, date: string): NightSky {
  const { latitudeDeg, longitudeDeg, elevationM } = observer.site
  const key = `${latitudeDeg} ${longitudeDeg} ${elevationM} ${date}`
  const nights = kept.get(almanac) ?? new Map<string, NightSky>()
  kept.set(almanac, nights)
  const sky = nights.get(key) ?? computeNightSky(observer, almanac, date)
  if (nights.size >= MOST_NIGHTS) nights.clear()
  nights.set(key, sky)
  return sky
}

/** First edge after noon and last edge before the next, unless it is the noon itself. */
function edges(intervals: readonly Interval[], noons: Interval): [Date | null, Date | null] {
  const from = intervals[0]?.[0]
  const to = intervals.at(-1)?.[1]
  return [
    from === undefined || from <= noons[0] ? null : dateOf(from),
    to === undefined || to >= noons[1] ? null : dateOf(to),
  ]
}

const described = new WeakMap<NightSky, Map<number, Night>>()

/** The record of a night that pages and tables use, made once for a twilight limit. */
export function describeNight(sky: NightSky, almanac: Almanac, twilightLimitDeg: number): Night {
  const known = described.get(sky) ?? new Map<number, Night>()
  described.set(sky, known)
  const night = known.get(twilightLimitDeg) ?? makeNight(sky, almanac, twilightLimitDeg)
  known.set(twilightLimitDeg, night)
  return night
}

function makeNight(sky: NightSky, almanac: Almanac, twilightLimitDeg: number): Night {
  const [sunset, sunrise] = edges(sky.sunDown, sky.noons)
  const civil = edges(sky.darkness(-6), sky.noons)
  const nautical = edges(sky.darkness(-12), sky.noons)
  const astronomical = edges(sky.darkness(-18), sky.noons)
  const twilight = (side: 0 | 1): Twilight => ({
    civil: civil[side],
    nautical: nautical[side],
    astronomical: astronomical[side],
  })
  const dark = sky.darkness(twilightLimitDeg)
  const first = dark[0]
  const last = dark.at(-1)
  const moonUp = sky.moonUp.flatMap(([from, to]) =>
    sky.sunDown.flatMap(([start, end]): [Date, Date][] => {
      const low = Math.max(from, start)
      const high = Math.min(to, end)
      return high > low ? [[dateOf(low), dateOf(high)]] : []
    }),
  )
  const downAllDay = sky.sunDown.some(([from, to]) => from <= sky.noons[0] && to >= sky.noons[1])
  return {
    date: sky.date,
    sunset,
    sunrise,
    eveningTwilight: twilight(0),
    morningTwilight: twilight(1),
    darkFrom: first ? dateOf(first[0]) : null,
    darkTo: last ? dateOf(last[1]) : null,
    darkHours: dark.reduce((sum, [from, to]) => sum + (to - from) * 24, 0),
    moonIllumination: moonIllumination(almanac, sky.middle),
    moonUp,
    polar: sky.sunDown.length === 0 ? 'day' : downAllDay ? 'night' : null,
  }
}
