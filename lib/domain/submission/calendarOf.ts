import ical, {
  ICalCalendarMethod,
  ICalEventStatus,
  ICalEventTransparency,
  type ICalCalendar,
} from 'ical-generator'
import { formatCalendarDate, formatHoursFromSeconds, formatQuantity } from '@/lib/format'
import { paths } from '@/lib/paths'
import type { AwardedNights } from '../decisions/readAwardedNights'
import type { SentProposal } from './readSent'
import { weeksAhead } from './weeksAhead'

const minute = 60_000

interface CalendarFacts {
  sent: Pick<SentProposal, 'contents' | 'deadline'>
  email: string
  origin: string
  /** Nights of an award; null before there is one. */
  awarded: AwardedNights | null
}

function addNights(calendar: ICalCalendar, { sent, origin, awarded }: CalendarFacts): void {
  const { contents } = sent
  const { reference, call } = contents
  for (const night of awarded?.nights ?? []) {
    const given = awarded?.lines.filter(
      (line) => !line.isReserve && night.instruments.includes(line.instrument),
    )
    const hours = given?.map(
      ({ instrument, seconds, service }) =>
        `${formatHoursFromSeconds(seconds)} of ${instrument} (${service})`,
    )
    calendar.createEvent({
      id: `${reference}-night-${night.id}@${new URL(origin).hostname}`,
      sequence: contents.version,
      start: night.from,
      end: night.to,
      // The call has the night; who observes on it is decided under the sky, but for a visit's own.
      status: night.isVisit ? ICalEventStatus.CONFIRMED : ICalEventStatus.TENTATIVE,
      transparency: night.isVisit ? ICalEventTransparency.OPAQUE : ICalEventTransparency.TRANSPARENT,
      summary: `${reference}: ${night.isVisit ? 'your visit' : 'may be observed'}, ${night.instruments.join(' and ')} on the ${night.telescope}`,
      description: [
        contents.title,
        `Dark time of call ${call.number} on the ${night.telescope}, evening of ${formatCalendarDate(night.eveningDate)}. A target is usable for up to ${formatQuantity(night.usableHours, 1, 'h')}.`,
        `Awarded in all: ${hours?.join(', ')}. ${night.isVisit ? 'The night is yours.' : 'The night is not assigned to you alone.'}`,
      ].join('\n'),
      url: `${origin}${paths.proposalOutcome(reference)}`,
    })
  }
}

/**
 * The weeks ahead, and once time is awarded the nights it may be observed on, as an iCalendar file (RFC 5545). A date
 * keeps its id, so that loading the file again moves it.
 */
export function calendarOf(facts: CalendarFacts): string {
  const { sent, email, origin } = facts
  const { contents, deadline } = sent
  const calendar = ical({ name: `${contents.reference}, call ${contents.call.number}` })
  calendar.method(ICalCalendarMethod.PUBLISH)
  for (const { id, at, dayOnly, words } of weeksAhead(contents, deadline, { email }))
    calendar.createEvent({
      id: `${contents.reference}-${id}@${new URL(origin).hostname}`,
      sequence: contents.version,
      start: at,
      end: dayOnly ? undefined : new Date(at.getTime() + 15 * minute),
      allDay: dayOnly,
      summary: `${contents.reference}: ${words}`,
      description: contents.title,
      url: `${origin}${paths.proposalSent(contents.reference)}`,
    })
  addNights(calendar, facts)
  // Section 3.1: the last line ends like the others, which the library leaves to us.
  return `${calendar.toString().trimEnd()}\r\n`
}
