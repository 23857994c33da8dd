import ical, { ICalCalendarMethod } from 'ical-generator'
import { paths } from '@/lib/paths'
import type { SentProposal } from './readSent'
import { weeksAhead } from './weeksAhead'

const minute = 60_000

/** The weeks ahead as an iCalendar file. A date keeps its id, so that loading the file again moves it. */
export function calendarOf(
  sent: Pick<SentProposal, 'contents' | 'deadline'>,
  email: string,
  origin: string,
): string {
  const { contents, deadline } = sent
  const calendar = ical({ name: `${contents.reference}, call ${contents.call.number}` })
  calendar.method(ICalCalendarMethod.PUBLISH)
  for (const { id, at, dayOnly, words } of weeksAhead(contents, deadline, { email }))
    calendar.createEvent({
      id: `${contents.reference}-${id}@${new URL(origin).hostname}`,
      start: at,
      end: dayOnly ? undefined : new Date(at.getTime() + 15 * minute),
      allDay: dayOnly,
      summary: `${contents.reference}: ${words}`,
      description: contents.title,
      url: `${origin}${paths.proposalSent(contents.reference)}`,
    })
  return calendar.toString()
}
