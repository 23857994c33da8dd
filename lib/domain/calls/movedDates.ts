import { eveningAfter } from './evenings'
import type { Call } from './types'

const day = 86_400_000
const dates = [
  'opensAt',
  'closesAt',
  'graceUntil',
  'assessmentsDueAt',
  'reviewsDueAt',
  'panelMeetsAt',
  'lettersAt',
] as const

/** What a new call begins with: season and dates of an earlier one, moved. Texts as their fields keep them. */
export type MovedDates = Record<(typeof dates)[number] | 'seasonFrom' | 'seasonTo', string>

/** Last day of the month so many months after that of a date. */
const monthEnd = (date: string, months: number) =>
  new Date(Date.UTC(Number(date.slice(0, 4)), Number(date.slice(5, 7)) + months, 0))
    .toISOString()
    .slice(0, 10)

const monthsTo = (from: string, to: string) =>
  12 * (Number(to.slice(0, 4)) - Number(from.slice(0, 4))) + Number(to.slice(5, 7)) - Number(from.slice(5, 7))

/** The season that follows one: as many whole months where it is made of them, else as many nights. */
function nextSeason({ seasonFrom, seasonTo }: { seasonFrom: string; seasonTo: string }, nights: number) {
  const from = eveningAfter(seasonTo, 1)
  const isWhole = seasonFrom.endsWith('-01') && seasonTo === monthEnd(seasonTo, 0)
  return {
    seasonFrom: from,
    seasonTo: isWhole ? monthEnd(from, monthsTo(seasonFrom, seasonTo)) : eveningAfter(seasonTo, nights),
  }
}

/**
 * The season that follows the one of a call, and the dates of the call moved by as many whole weeks
 * as fit: each falls on the same day of the week, at the same hour of UTC.
 */
export function movedDates(call: Pick<Call, (typeof dates)[number] | 'seasonFrom' | 'seasonTo'>): MovedDates {
  const nights = Math.round((Date.parse(call.seasonTo) - Date.parse(call.seasonFrom)) / day) + 1
  const weeks = Math.floor(nights / 7)
  const moved = dates.map((name) => [name, new Date(call[name].getTime() + weeks * 7 * day).toISOString()])
  return {
    ...(Object.fromEntries(moved) as Record<(typeof dates)[number], string>),
    ...nextSeason(call, nights),
  }
}
