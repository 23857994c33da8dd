import { z } from 'zod'
import { obsPlanCsv } from './obsPlanCsv'
import { planCalendar } from './planCalendar'
import { planCsv } from './planCsv'
import type { NightPlan } from './types'

/** The forms a night plan is handed out in. */
export const planFileName = z.enum(['nights.csv', 'obsplan.csv', 'nights.ics'])

/** A night plan as a file: its text, and the name it is saved under. */
export function planFile(
  plan: NightPlan,
  file: z.output<typeof planFileName>,
  where: { origin: string; url: string },
): { text: string; type: string; name: string } {
  const name = `call-${plan.callNumber}-${file}`
  if (file === 'nights.ics')
    return { text: planCalendar(plan, where), type: 'text/calendar; charset=utf-8', name }
  const text = file === 'obsplan.csv' ? obsPlanCsv(plan) : planCsv(plan)
  return { text, type: 'text/csv; charset=utf-8', name }
}
