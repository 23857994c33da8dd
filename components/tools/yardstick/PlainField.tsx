'use client'

import { useId, type ReactNode } from 'react'
import { FieldFrame } from '@/components/forms/FieldFrame'
import { controlClasses } from '@/components/forms/controlClasses'
import { ReadBack } from '@/components/ui/ReadBack'

export interface PlainFieldProps {
  label: ReactNode
  help?: ReactNode
  value: string
  onChange: (value: string) => void
  error?: string
  optional?: boolean
  /** The value as understood, where that differs from what was typed. */
  readBack?: string | null
}

/** One line of text that is read as it is typed. */
export function PlainField({ label, help, value, onChange, error, optional, readBack }: PlainFieldProps) {
  const id = useId()
  const [helpId, errorId] = [`${id}-help`, `${id}-error`]
  const described = [error && errorId, help && helpId].filter(Boolean).join(' ')
  return (
    <FieldFrame
      htmlFor={id}
      label={label}
      help={help}
      helpId={helpId}
      error={error}
      errorId={errorId}
      optional={optional}
    >
      <input
        id={id}
        type="text"
        value={value}
        onChange={(event) => onChange(event.target.value)}
        autoComplete="off"
        spellCheck={false}
        maxLength={120}
        aria-invalid={error ? true : undefined}
        aria-describedby={described || undefined}
        className={controlClasses(Boolean(error), false)}
      />
      {readBack && !error ? <ReadBack>{readBack}</ReadBack> : null}
    </FieldFrame>
  )
}
