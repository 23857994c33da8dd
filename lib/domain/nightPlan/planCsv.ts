import { csvText } from '@/lib/format'
import type { NightPlan } from './types'

const head = [
  'Proposal',
  'Title',
  'Rank',
  'Telescope',
  'Instrument',
  'Mode',
  'Target',
  'Right ascension (deg, ICRS)',
  'Declination (deg, ICRS)',
  'Service',
  'Reserve',
  'Conditions',
  'First evening',
  'Last evening',
  'Of the night',
  'Sidereal time from (h)',
  'Moonlight',
  'Hours',
]

const degrees = (deg: number | null | undefined) =>
  deg === null || deg === undefined ? undefined : Number(deg.toFixed(7))
const hours = (seconds: number) => Number((seconds / 3600).toFixed(3))

/** The night plan as a file: a line for each bin a target is laid in and each night of a visit, and one without a bin for what finds no place. */
export function planCsv({ parts }: NightPlan): string {
  return csvText(
    head,
    parts.flatMap((part) => {
      const { number, title, rank, telescope, instrument, mode, target } = part
      const own = [
        ...[number, title, rank, telescope, instrument, mode?.name, target?.name],
        ...[
          degrees(target?.raDeg),
          degrees(target?.decDeg),
          part.service,
          part.isReserve ? 'yes' : 'no',
          part.conditions,
        ],
      ]
      const left = part.seconds - part.pieces.reduce((sum, { seconds }) => sum + seconds, 0)
      return [
        ...part.pieces.map(({ fromEvening, toEvening, ofNight, siderealFromH, moon, seconds }) => [
          ...own,
          ...[fromEvening, toEvening, ofNight ?? '', siderealFromH, moon, hours(seconds)],
        ]),
        ...(left >= 1 ? [[...own, '', '', '', '', '', hours(left)]] : []),
      ]
    }),
  )
}
