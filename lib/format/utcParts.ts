import { monthNames } from './monthNames'

export interface UtcParts {
  year: number
  month: string
  day: number
  hour: string
  minute: string
  second: string
}

const two = (value: number) => String(value).padStart(2, '0')

/** The parts of an instant as read on a clock so many hours east of UTC, ready to print. */
export function utcParts(at: Date, offsetHours = 0): UtcParts {
  const shifted = new Date(at.getTime() + offsetHours * 3_600_000)
  return {
    year: shifted.getUTCFullYear(),
    month: monthNames[shifted.getUTCMonth()] ?? '',
    day: shifted.getUTCDate(),
    hour: two(shifted.getUTCHours()),
    minute: two(shifted.getUTCMinutes()),
    second: two(shifted.getUTCSeconds()),
  }
}
