import { formatCalendarDate } from '@/lib/format'

/** `ALDOUS retires on 1 March 2028`, or `ALDOUS has been retired since 1 March 2028` once that evening has come. */
export const retirementWords = (name: string, retiredFrom: string, today: string): string =>
  retiredFrom > today
    ? `${name} retires on ${formatCalendarDate(retiredFrom)}`
    : `${name} has been retired since ${formatCalendarDate(retiredFrom)}`
