import type { Assessment } from '@/lib/domain/assessments/types'
import { formatHoursFromSeconds } from '@/lib/format'

const starts = {
  accepted: 'Accepted, with true overheads',
  change: 'Change, true hours',
  'not-possible': 'Not possible, true hours',
} as const

/** `Accepted, with true overheads: 20.2 h`. */
export function assessmentWords({
  verdict,
  trueSeconds,
}: Pick<Assessment, 'verdict' | 'trueSeconds'>): string {
  return `${starts[verdict]}: ${formatHoursFromSeconds(trueSeconds)}`
}
