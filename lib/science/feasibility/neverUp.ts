import { DEG_RAD } from '../constants'
import { airmassYoung1994, altitudeOfAirmassDeg, openHourAngles, type PointingLimits } from '../sky'
import { limitWords } from './limitWords'
import { sayNumber } from './saying'

export interface NeverUpInput {
  readonly site: { readonly latitudeDeg: number; readonly lowestAltitudeDeg: number }
  /** What stands around the telescope, and its blind spot. */
  readonly pointing?: Omit<PointingLimits, 'lowestAltitudeDeg'>
  readonly raDeg: number
  readonly decDeg: number
  readonly maxAirmass: number
  /** Whether any night of the season is dark enough at all. */
  readonly isEverDark: boolean
  /** Whether hours with the Moon up were left out. */
  readonly isMoonLimited?: boolean
}

const months = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
]
/** The Sun stands at right ascension 0 about 20 March, the 79th day of the year. */
const EQUINOX_DAY = 79
const DAYS = 365.2422

/** Month in which a right ascension crosses the meridian at midnight: the Sun stands opposite. Good to some days. */
function midnightMonth(raDeg: number): string {
  const day = (EQUINOX_DAY + (((raDeg + 180) % 360) / 360) * DAYS) % DAYS
  const month = new Date(Date.UTC(2027, 0, 1 + Math.floor(day))).getUTCMonth()
  return months[month] ?? ''
}

/**
 * Why a target is not up in the dark on any night of a season, and what would change that. Degrees; the
 * place of J2000, so altitudes to some 0.2 degrees.
 */
export function neverUp(input: NeverUpInput): { why: string; fix: string } {
  const { site, pointing, raDeg, decDeg, maxAirmass } = input
  const topDeg = 90 - Math.abs(site.latitudeDeg - decDeg)
  const never = 'Take another target: no season brings this one up here.'
  if (topDeg <= 0)
    return {
      why: `Never rises here: at its highest it is ${sayNumber(-topDeg, 0)}° below the horizon.`,
      fix: never,
    }
  const top = `Climbs to ${sayNumber(topDeg, 0)}° at most`
  if (topDeg < site.lowestAltitudeDeg)
    return {
      why: `${top}; the telescope goes no lower than ${sayNumber(site.lowestAltitudeDeg, 0)}°.`,
      fix: never,
    }
  if (topDeg < altitudeOfAirmassDeg(maxAirmass)) {
    const airmass = airmassYoung1994(topDeg) ?? Infinity
    return {
      why: `${top}, airmass ${sayNumber(airmass, 2)}: never within ${maxAirmass}.`,
      fix: `Accept an airmass of ${sayNumber(Math.floor(airmass * 10 + 1) / 10, 1)} or more.`,
    }
  }
  const limits = limitWords(pointing)
  const open = openHourAngles(site.latitudeDeg * DEG_RAD, decDeg * DEG_RAD, {
    ...pointing,
    lowestAltitudeDeg: Math.max(site.lowestAltitudeDeg, altitudeOfAirmassDeg(maxAirmass)),
  })
  if (open.length === 0)
    return {
      why: `${top}, but never above airmass ${maxAirmass}${limits}.`,
      fix: 'Accept a larger airmass, or ask for another telescope.',
    }
  if (!input.isEverDark)
    return {
      why: 'No night of this season is dark enough at this site.',
      fix: 'Ask in another season, or with a mode that works in twilight.',
    }
  const dark = input.isMoonLimited ? 'in the dark and within the Moon limits' : 'in the dark'
  return {
    why: `Never above airmass ${maxAirmass}${limits && `${limits},`} ${dark} in this season.`,
    fix: `Ask for the months around ${midnightMonth(raDeg)}, when it is highest at midnight.`,
  }
}
