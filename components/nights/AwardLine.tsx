'use client'

import { useWatch } from 'react-hook-form'
import { CheckboxField } from '@/components/forms/CheckboxField'
import { NumberField } from '@/components/forms/NumberField'
import { SelectField } from '@/components/forms/SelectField'
import { TextField } from '@/components/forms/TextField'
import { Button } from '@/components/ui/Button'
import type { NightsLine, NightsView } from '@/lib/domain/decisions/nightsView'
import { visitInWords } from '@/lib/domain/wishes/visitWords'
import { formatHoursFromSeconds } from '@/lib/format'
import { leastByWords } from './nightsWords'

export interface AwardLineProps {
  line: NightsLine
  index: number
  telescope: NightsView['telescopes'][number] | undefined
  onFill: (seconds: number) => void
  onEvenings: (text: string) => void
}

const services = [
  { value: 'queue', label: 'queue' },
  { value: 'visitor', label: 'visitor' },
]

/** One instrument of an award. */
export function AwardLine({ line, index, telescope, onFill, onEvenings }: AwardLineProps) {
  const isVisit = useWatch({ name: `lines.${index}.service` }) === 'visitor'
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
          {asked}; {formatHoursFromSeconds(line.leastSeconds)} is the least of use{leastByWords[line.leastBy]}
          ; {formatHoursFromSeconds(Math.max(0, left))} left on {line.telescope}
          {line.visit ? `; they wish for a visit of ${visitInWords(line.visit)}` : null}
        </span>
      </p>
      <div className="flex flex-wrap items-end gap-x-6 gap-y-4">
        {isVisit ? (
          <div className="w-full max-w-prose">
            <TextField
              name={`lines.${index}.evenings`}
              label="Evenings of the visit"
              help="Year-month-day with commas between, “first” or “second” behind a date for half of its night. The hours follow from them."
              offReason={off}
            />
          </div>
        ) : (
          <NumberField name={`lines.${index}.hours`} label="Hours" unit="h" offReason={off} />
        )}
        <div className="flex gap-2 pb-1">
          {isVisit && line.possible ? (
            <>
              {line.suggestedEvenings ? (
                <Button look="secondary" size="small" onClick={() => onEvenings(line.suggestedEvenings)}>
                  As suggested
                </Button>
              ) : null}
              <Button look="secondary" size="small" onClick={() => onEvenings('')}>
                None
              </Button>
            </>
          ) : null}
          {line.possible && !isVisit
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
