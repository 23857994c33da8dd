import { NextMoonQuarter, SearchMoonQuarter } from 'astronomy-engine'
import { ScienceError } from '../ScienceError'
import { daysOf } from './time'

export interface MoonPhase {
  readonly phase: 'new' | 'first-quarter' | 'full' | 'last-quarter'
  readonly at: Date
}

const names = ['new', 'first-quarter', 'full', 'last-quarter'] as const

/** New, full and quarter Moons from one moment to another, in order. */
export function moonPhases(from: Date, to: Date): MoonPhase[] {
  const days = daysOf(to) - daysOf(from)
  if (!(days >= 0 && days <= 3660)) {
    throw new ScienceError('bad-date', 'The Moon’s phases are listed for up to ten years, first date first.')
  }
  const found: MoonPhase[] = []
  for (let next = SearchMoonQuarter(from); next.time.date <= to; next = NextMoonQuarter(next)) {
    const phase = names[next.quarter]
    if (phase) found.push({ phase, at: next.time.date })
  }
  return found
}
