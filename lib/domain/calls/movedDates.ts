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

/**
 * The season that follows the one of a call, as long as it was, and the dates of the call moved by as many whole weeks
 * as fit: each falls on the same day of the week, at the same hour of UTC.
 */
export function movedDates(call: Pick<Call, (typeof dates)[number] | 'seasonFrom' | 'seasonTo'>): MovedDates {
  const nights = Math.round((Date.parse(call.seasonTo) - Date.parse(call.seasonFrom)) / day) + 1
  const weeks = Math.floor(nights / 7)
  const moved = dates.map((name) => [name, new Date(call[name].getTime() + weeks * 7 * day).toISOString()])
  return {
    ...(Object.fromEntries(moved) as Record<(typeof dates)[number], string>),
    seasonFrom: eveningAfter(call.seasonTo, 1),
    seasonTo: eveningAfter(call.seasonTo, nights),
  }
}
