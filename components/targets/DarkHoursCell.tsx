'use client'

import { MonthSparkline } from '@/components/charts/MonthSparkline'
import { ComputedNumber } from '@/components/ui/ComputedNumber'
import { ABSENT, formatCalendarDate, formatHours, formatNumber, formatQuantity } from '@/lib/format'
import type { TargetComputation } from '@/lib/domain/observations/types'

export interface DarkHoursCellProps {
  name: string
  computed: TargetComputation
  maxAirmass: number
  limits: string
  /** Evening dates. */
  seasonFrom: string
  seasonTo: string
  /** The hours of a full bar: those of the best month of any target. */
  fullBar: number
  engineVersion: string
}

/** Dark hours above the airmass limit, with a bar a month; opens to the months and how it was counted. */
export function DarkHoursCell(props: DarkHoursCellProps) {
  const { name, computed, maxAirmass, limits, seasonFrom, seasonTo, fullBar, engineVersion } = props
  if (computed.visibleHours === null) return <span className="text-muted">{ABSENT}</span>
  const months = computed.visibleHoursByMonth.map(({ month, hours }) => ({
    month: formatCalendarDate(`${month}-01`).replace(/^\d+ /, ''),
    sum: hours,
  }))
  return (
    <span className="inline-flex items-end gap-2">
      <ComputedNumber
        shown={formatNumber(computed.visibleHours, 0)}
        value={formatHours(computed.visibleHours)}
        what={`dark hours, ${name}`}
        formula={`Sun below −18°, airmass ≤ ${maxAirmass}${limits}`}
        inputs={months.map(({ month, sum }) => ({ term: month, value: formatQuantity(sum, 1, 'h') }))}
        source={`Every night from ${formatCalendarDate(seasonFrom)} to ${formatCalendarDate(seasonTo)}, whatever the Moon does; airmass after Young 1994, edges within 60 s. Engine ${engineVersion}.`}
      />
      <MonthSparkline months={months} max={fullBar} />
    </span>
  )
}
