'use client'

import { ComputedNumber } from '@/components/ui/ComputedNumber'
import { ABSENT, formatDuration, formatHoursFromSeconds, formatNumber } from '@/lib/format'
import type { ObservationComputation } from '@/lib/domain/observations/types'

export interface NeededCellProps {
  name: string
  computed: readonly ObservationComputation[]
}

/** Hours needed, overheads included; opens to what they are made of. */
export function NeededCell({ name, computed }: NeededCellProps) {
  const known = computed.filter(({ neededSeconds }) => neededSeconds !== null)
  if (known.length === 0) return <span className="text-muted">{ABSENT}</span>
  const sum = (read: (one: ObservationComputation) => number | null) =>
    known.reduce((total, one) => total + (read(one) ?? 0), 0)
  const needed = sum(({ neededSeconds }) => neededSeconds)
  const [first] = known
  return (
    <ComputedNumber
      shown={formatNumber(needed / 3600, 1)}
      value={formatHoursFromSeconds(needed)}
      what={`needed, ${name}`}
      formula="t = t(open) + acquisition + read-out + calibration"
      inputs={[
        {
          term: 'Open shutter',
          value: formatHoursFromSeconds(sum(({ openShutterSeconds }) => openShutterSeconds)),
        },
        { term: 'Overheads', value: formatHoursFromSeconds(sum(({ overheadSeconds }) => overheadSeconds)) },
        ...(known.length === 1 && first?.subExposureSeconds
          ? [
              {
                term: 'Sub-exposures',
                value: `${first.subExposures ?? ABSENT} of ${formatDuration(first.subExposureSeconds)}`,
              },
            ]
          : [{ term: 'Observations', value: String(known.length) }]),
      ]}
      source={`${first?.regime ?? ''} At the poorest conditions asked for. CCD equation after Merline & Howell 1995.`}
    />
  )
}
