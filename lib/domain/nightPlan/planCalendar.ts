import ical, {
  ICalCalendarMethod,
  ICalEventStatus,
  ICalEventTransparency,
  type ICalCalendar,
} from 'ical-generator'
import { formatHoursFromSeconds } from '@/lib/format'
import { halfOf } from '../nights/halfOf'
import type { NightPlan, PlannedPart } from './types'

const dayMs = 86_400_000

interface HalfPlan {
  half: number
  fromEvening: string
  toEvening: string
  seconds: number
  parts: PlannedPart[]
}

/** What is laid of some parts in each half-month. */
function byHalf(parts: readonly PlannedPart[]): HalfPlan[] {
  const halves = new Map<number, HalfPlan>()
  for (const part of parts)
    for (const { fromEvening, toEvening, seconds } of part.pieces) {
      const half = halfOf(fromEvening)
      const own = halves.get(half) ?? { half, fromEvening, toEvening, seconds: 0, parts: [] }
      halves.set(half, {
        half,
        fromEvening: fromEvening < own.fromEvening ? fromEvening : own.fromEvening,
        toEvening: toEvening > own.toEvening ? toEvening : own.toEvening,
        seconds: own.seconds + seconds,
        parts: own.parts.includes(part) ? own.parts : [...own.parts, part],
      })
    }
  return [...halves.values()].sort((a, b) => a.half - b.half)
}

/** An event for each night of a visit, at its own time: nobody else has the telescope then. */
function addVisit(
  calendar: ICalCalendar,
  plan: NightPlan,
  part: PlannedPart,
  { origin, url }: { origin: string; url: string },
): void {
  const { number, title, instrument, telescope, instrumentId, conditions, pieces } = part
  for (const { fromEvening, ofNight, from, to } of pieces)
    calendar.createEvent({
      id: `plan-${plan.callSlug}-${number}-${instrumentId}-visit-${fromEvening}@${new URL(origin).hostname}`,
      sequence: plan.version,
      start: from,
      end: to,
      status: ICalEventStatus.CONFIRMED,
      transparency: ICalEventTransparency.OPAQUE,
      summary: `${number}: visit, ${instrument} on ${telescope}${ofNight === 'whole' ? '' : `, ${ofNight}`}`,
      description: [title, ...(conditions ? [`Conditions: ${conditions}.`] : [])].join('\n'),
      url,
    })
}

/**
 * The night plan as an iCalendar file (RFC 5545): an event for each award on an instrument in each half-month, and for
 * each night of a visit. An event
 * keeps its id and its sequence rises with the decisions, so that loading the file again moves it.
 */
export function planCalendar(plan: NightPlan, { origin, url }: { origin: string; url: string }): string {
  const calendar = ical({ name: `Night plan of call ${plan.callNumber}` })
  calendar.method(ICalCalendarMethod.PUBLISH)
  const keyOf = ({ number, instrumentId }: PlannedPart) => `${number}-${instrumentId}`
  for (const award of new Set(plan.parts.map(keyOf))) {
    const parts = plan.parts.filter((part) => keyOf(part) === award && part.observationId !== null)
    for (const { half, fromEvening, toEvening, seconds, parts: own } of byHalf(parts)) {
      const [first] = own
      if (!first) continue
      const { number, instrument, telescope, title, conditions } = first
      calendar.createEvent({
        id: `plan-${plan.callSlug}-${award}-${half}@${new URL(origin).hostname}`,
        sequence: plan.version,
        start: new Date(Date.parse(fromEvening)),
        // The day after the last evening: the end of a whole-day event is not in it.
        end: new Date(Date.parse(toEvening) + dayMs),
        allDay: true,
        timezone: 'UTC',
        status: ICalEventStatus.TENTATIVE,
        transparency: ICalEventTransparency.TRANSPARENT,
        summary: `${number}: ${formatHoursFromSeconds(seconds)} of ${instrument} on ${telescope}${first.isReserve ? ', in reserve' : ''}`,
        description: [
          title,
          `Targets: ${own.map(({ target }) => target?.name ?? 'no position yet').join(', ')}.`,
          ...(conditions ? [`Conditions: ${conditions}.`] : []),
        ].join('\n'),
        url,
      })
    }
  }
  for (const part of plan.parts)
    if (part.observationId === null) addVisit(calendar, plan, part, { origin, url })
  // Section 3.1: the last line ends like the others, which the library leaves to us.
  return `${calendar.toString().trimEnd()}\r\n`
}
