'use client'

import type { ReactNode } from 'react'
import { useWatch } from 'react-hook-form'
import { classNames } from '@/components/ui/classNames'
import { formatNumber } from '@/lib/format'
import { controlClasses } from './controlClasses'
import { describedBy } from './describedBy'
import { FieldFrame } from './FieldFrame'
import { useField } from './useField'

export interface TextAreaFieldProps {
  name: string
  label: ReactNode
  help?: ReactNode
  optional?: boolean
  hideLabel?: boolean
  /** Lines shown; five by default. */
  rows?: number
  /** The most characters the schema takes: counted at the right below, never cut off. */
  limit?: number
  /** Lines like a ledger's, one value each. */
  ruled?: boolean
  /** Grows with what is typed, for long texts. */
  grows?: boolean
  spellCheck?: boolean
  offReason?: string
}

/** Long text, with its count at the right below. */
export function TextAreaField(props: TextAreaFieldProps) {
  const { name, label, help, optional, hideLabel, rows = 5, limit, ruled = false, offReason } = props
  const field = useField(name)
  const value: unknown = useWatch({ name, control: field.control })
  const length = typeof value === 'string' ? [...value].length : 0
  const shownHelp = offReason ?? help
  return (
    <FieldFrame
      {...field}
      htmlFor={field.id}
      label={label}
      help={shownHelp}
      optional={optional}
      hideLabel={hideLabel}
      muted={Boolean(offReason)}
    >
      <textarea
        {...field.register()}
        defaultValue={field.initialText}
        id={field.id}
        rows={rows}
        readOnly={Boolean(offReason)}
        spellCheck={props.spellCheck ?? true}
        aria-invalid={field.error ? true : undefined}
        aria-describedby={describedBy(field, Boolean(shownHelp), limit ? `${field.id}-count` : false)}
        className={classNames(
          controlClasses(Boolean(field.error), Boolean(offReason)),
          'block py-2',
          ruled && 'ruled-lines',
          props.grows && 'grows',
        )}
      />
      {limit ? (
        <p
          id={`${field.id}-count`}
          className={classNames(
            'm-0 mt-1 text-right text-caption',
            length > limit ? 'font-semibold text-not-feasible' : 'text-muted',
          )}
        >
          {formatNumber(length)} of {formatNumber(limit)}
        </p>
      ) : null}
    </FieldFrame>
  )
}
