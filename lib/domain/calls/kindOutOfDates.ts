import { formatUtcWithYear } from '@/lib/format'
import type { CallDates, CallKind } from './types'

/** The first kind whose own deadline no longer fits the dates of its call: the field at fault and a sentence. */
export function kindOutOfDates(
  kinds: readonly Pick<CallKind, 'title' | 'closesAt'>[],
  dates: Pick<CallDates, 'opensAt' | 'assessmentsDueAt'>,
): { field: 'opensAt' | 'assessmentsDueAt'; sentence: string } | null {
  for (const { title, closesAt } of kinds) {
    if (!closesAt) continue
    const own = `“${title}” closes ${formatUtcWithYear(closesAt)}`
    if (closesAt <= dates.opensAt)
      return { field: 'opensAt', sentence: `${own}, which must come after the opening.` }
    if (closesAt >= dates.assessmentsDueAt)
      return { field: 'assessmentsDueAt', sentence: `${own}, which must come before assessments are due.` }
  }
  return null
}
