'use client'

import type { ReactNode } from 'react'
import { useController } from 'react-hook-form'
import { ReadBack } from '@/components/ui/ReadBack'
import { formatAtSite, formatUtcInstant } from '@/lib/format'
import { controlClasses } from './controlClasses'
import { describedBy } from './describedBy'
import { FieldFrame } from './FieldFrame'
import { useField } from './useField'
import { joinUtc, parseUtc, splitUtc } from './utcText'

export interface DateTimeFieldProps {
  name: string
  label: ReactNode
  help?: ReactNode
  optional?: boolean
  /** Reads the instant back on the site's clock, too. */
  utcOffsetHours?: number
}

/** A date and a time in UTC, to the second; kept as `2027-03-31T22:00:00Z`, or an empty text. */
export function DateTimeField({ name, label, help, optional, utcOffsetHours }: DateTimeFieldProps) {
  const field = useField(name)
  const { field: bound } = useController({ name, control: field.control })
  const text = typeof bound.value === 'string' ? bound.value : ''
  const { date, time } = splitUtc(text)
  const at = parseUtc(text)
  const change = (nextDate: string, nextTime: string) => {
    bound.onChange(joinUtc(nextDate, nextTime))
    field.recheck()
  }
  const shared = {
    'aria-invalid': field.error ? (true as const) : undefined,
    'aria-describedby': describedBy(field, Boolean(help)),
    onBlur: bound.onBlur,
    className: controlClasses(Boolean(field.error), false),
  }
  return (
    <FieldFrame {...field} as="fieldset" label={label} help={help} optional={optional}>
      <div className="flex max-w-96 flex-wrap items-center gap-3">
        <span className="min-w-0 grow basis-34 max-sm:basis-full">
          <input
            {...shared}
            id={field.id}
            type="date"
            aria-label="Date"
            value={date}
            onChange={(event) => change(event.target.value, time)}
          />
        </span>
        <span className="min-w-0 grow basis-34">
          <input
            {...shared}
            type="time"
            step={1}
            aria-label="Time, UTC"
            value={time}
            onChange={(event) => change(date, event.target.value)}
          />
        </span>
        <span className="text-table text-muted">UTC</span>
      </div>
      {at ? (
        <ReadBack>
          {formatUtcInstant(at)}
          {utcOffsetHours === undefined ? '' : `, ${formatAtSite(at, utcOffsetHours)}`}
        </ReadBack>
      ) : null}
    </FieldFrame>
  )
}
