'use client'

import { CheckboxField } from '@/components/forms/CheckboxField'
import { NumberField } from '@/components/forms/NumberField'
import { SelectField } from '@/components/forms/SelectField'
import { TextField } from '@/components/forms/TextField'
import { Button } from '@/components/ui/Button'
import type { NightsLine, NightsView } from '@/lib/domain/decisions/nightsView'
import { formatHoursFromSeconds } from '@/lib/format'

export interface AwardLineProps {
  line: NightsLine
  index: number
  telescope: NightsView['telescopes'][number] | undefined
  onFill: (seconds: number) => void
}

const services = [
  { value: 'queue', label: 'queue' },
  { value: 'visitor', label: 'visitor' },
]

/** One instrument of an award. */
export function AwardLine({ line, index, telescope, onFill }: AwardLineProps) {
  const others = (telescope?.givenSeconds ?? 0) - (line.isReserve ? 0 : line.givenSeconds)
  const left = (telescope?.offeredSeconds ?? 0) - others
  const asked =
    line.wholeSeconds === line.askedSeconds
      ? `${formatHoursFromSeconds(line.askedSeconds)} asked`
      : `${formatHoursFromSeconds(line.askedSeconds)} asked, ${formatHoursFromSeconds(line.wholeSeconds)} as assessed`
  const off = line.possible ? undefined : `Assessed as not possible: ${line.assessment?.reason ?? ''}`
  return (
    <fieldset className="m-0 border-0 border-t border-rule p-0 pt-3">
      <legend className="sr-only">{line.instrument}</legend>
      <p className="mt-0 mb-3 text-table">
        <strong>{line.instrument}</strong>{' '}
        <span className="text-muted">
          {asked}; {formatHoursFromSeconds(line.leastSeconds)} is the least of use;{' '}
          {formatHoursFromSeconds(Math.max(0, left))} left on {line.telescope}
        </span>
      </p>
      <div className="flex flex-wrap items-end gap-x-6 gap-y-4">
        <NumberField name={`lines.${index}.hours`} label="Hours" unit="h" offReason={off} />
        <div className="flex gap-2 pb-1">
          {line.possible
            ? (
                [
                  ['Whole', line.wholeSeconds],
                  ['Least', line.leastSeconds],
                  ['None', 0],
                ] as const
              ).map(([words, seconds]) => (
                <Button key={words} look="secondary" size="small" onClick={() => onFill(seconds)}>
                  {words}
                </Button>
              ))
            : null}
        </div>
        <SelectField name={`lines.${index}.service`} label="Service" options={services} width="short" />
        <div className="min-w-60 grow">
          <TextField name={`lines.${index}.conditions`} label="Conditions" optional maxLength={300} />
        </div>
      </div>
      <div className="mt-3">
        <CheckboxField
          name={`lines.${index}.isReserve`}
          label="In reserve"
          help="Observed when time falls free; not counted against the offer."
        />
      </div>
    </fieldset>
  )
}
