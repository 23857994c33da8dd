import type { Role } from '../actor'
import type { Call } from './types'

export interface Deadline {
  words: string
  at: Date
  dayOnly: boolean
}

type Dated = Pick<
  Call,
  | 'number'
  | 'stage'
  | 'opensAt'
  | 'closesAt'
  | 'graceUntil'
  | 'assessmentsDueAt'
  | 'reviewsDueAt'
  | 'panelMeetsAt'
  | 'lettersAt'
>

function datesFor(call: Dated, role: Role | null): Deadline[] {
  const n = call.number
  const all: Record<string, Deadline> = {
    opens: { words: `Call ${n} opens in`, at: call.opensAt, dayOnly: false },
    closes: { words: `Call ${n} closes in`, at: call.closesAt, dayOnly: false },
    fees: { words: `Call ${n}: fees due in`, at: call.graceUntil, dayOnly: false },
    assessments: { words: 'Assessments due in', at: call.assessmentsDueAt, dayOnly: false },
    reviews: { words: 'Reviews due in', at: call.reviewsDueAt, dayOnly: false },
    panel: { words: 'Panel meets in', at: call.panelMeetsAt, dayOnly: false },
    letters: { words: 'Letters go out in', at: call.lettersAt, dayOnly: true },
  }
  const wanted: Record<Role | 'visitor', string[]> = {
    visitor: ['opens', 'closes'],
    investigator: ['opens', 'closes', 'letters'],
    reviewer: ['reviews', 'panel'],
    'instrument-scientist': ['assessments'],
    chair: ['reviews', 'panel', 'letters'],
    office: ['closes', 'fees', 'assessments', 'reviews', 'panel', 'letters'],
  }
  return wanted[role ?? 'visitor'].flatMap((key) => all[key] ?? [])
}

/** The next date that matters to a role, over all calls not yet decided; null when none lies ahead. */
export function nextDeadline(calls: readonly Dated[], role: Role | null, now: Date): Deadline | null {
  const ahead = calls
    .filter((call) => call.stage !== 'planned' && call.stage !== 'decided' && call.stage !== 'archived')
    .flatMap((call) => datesFor(call, role))
    .filter((date) => date.at > now)
    .sort((a, b) => a.at.getTime() - b.at.getTime())
  return ahead[0] ?? null
}
