import type { ConstraintSet } from '@/lib/domain/proposals/types'
import { formatCalendarDate, formatNumber } from '@/lib/format'

const moons = { dark: 'a dark sky', grey: 'a grey sky', any: 'any Moon' } as const
const skies = { photometric: 'photometric', clear: 'clear', 'thin-cloud': 'through thin cloud' } as const

/** A set of conditions as a sentence. */
export function constraintWords(set: Omit<ConstraintSet, 'id' | 'version'>): string {
  const { dateFrom, dateTo } = set
  const from = dateFrom ? ` from ${formatCalendarDate(dateFrom)}` : ''
  const to = dateTo ? ` to ${formatCalendarDate(dateTo)}` : ''
  return `airmass to ${formatNumber(set.maxAirmass, 1)}, an image of ${formatNumber(set.imageQualityArcsec, 1)}″ or better, ${moons[set.moon]}, no nearer than ${formatNumber(set.minMoonSeparationDeg)}°, ${skies[set.transparency]}${from}${to}${set.cadence ? `, ${set.cadence}` : ''}.`
}
