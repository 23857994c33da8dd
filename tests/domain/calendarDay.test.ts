import { describe, expect, it } from 'vitest'
import { setNightsSchema } from '@/lib/domain/calendar/schema'
import { calendarDay, isCalendarDay } from '@/lib/domain/calendarDay'
import { planCallSchema } from '@/lib/domain/calls/schema'

// Seen to fail with `Date.parse` in place of the calendar, which reads 30 February as 2 March.
describe('a day of the calendar', () => {
  it('is written as year-month-day and exists', () => {
    const days = ['2027-07-01', '2028-02-29', '2000-02-29', '2027-12-31']
    const none = ['2027-02-29', '2027-02-30', '1900-02-29', '2027-04-31', '2027-13-01', '27-07-01', '']
    expect([...days, ...none].filter(isCalendarDay)).toEqual(days)
  })

  it('is refused in words of its own', () => {
    expect(calendarDay.safeParse('2027-02-30').error?.issues[0]?.message).toBe('There is no such day.')
    expect(calendarDay.safeParse('1 July').error?.issues[0]?.message).toBe('Give a date as year-month-day.')
  })

  it('is asked of the night calendar and of a season', () => {
    const messages = (result: { error?: { issues: { path: PropertyKey[]; message: string }[] } }) =>
      (result.error?.issues ?? []).map(({ path, message }) => `${path.join('.')}: ${message}`)
    expect(messages(setNightsSchema.safeParse({ from: '2027-02-30', to: '2027-03-01' }))).toContain(
      'from: There is no such day.',
    )
    expect(
      messages(planCallSchema.safeParse({ seasonFrom: '2027-02-01', seasonTo: '2027-02-30' })),
    ).toContain('seasonTo: There is no such day.')
  })
})
