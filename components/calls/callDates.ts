import type { DateLineEntry } from '@/components/ui/DateLine'
import type { Call } from '@/lib/domain/calls/types'

/** The dates of a call in order, in words; fees are spoken of only where there are any. */
export function callDates(call: Call): DateLineEntry[] {
  return [
    { at: call.opensAt, words: `Call ${call.number} opens`, dayOnly: true },
    { at: call.closesAt, words: 'Proposals close' },
    { at: call.assessmentsDueAt, words: call.currency ? 'Fees and assessments in' : 'Assessments in' },
    { at: call.reviewsDueAt, words: 'Reviews in' },
    { at: call.panelMeetsAt, words: 'Panel draws the line', dayOnly: true },
    { at: call.lettersAt, words: 'Letters go out', dayOnly: true },
    { at: new Date(`${call.seasonFrom}T21:00:00Z`), words: 'First night', dayOnly: true },
  ]
}
