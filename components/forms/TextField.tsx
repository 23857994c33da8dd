'use client'

import type { HTMLInputAutoCompleteAttribute, ReactNode } from 'react'
import { controlClasses } from './controlClasses'
import { describedBy } from './describedBy'
import { FieldFrame } from './FieldFrame'
import { useField } from './useField'
import { widthClasses, type FieldWidth } from './widthClasses'

export interface TextFieldProps {
  name: string
  label: ReactNode
  help?: ReactNode
  optional?: boolean
  hideLabel?: boolean
  type?: 'text' | 'email' | 'password' | 'search' | 'tel' | 'url'
  autoComplete?: HTMLInputAutoCompleteAttribute
  inputMode?: 'text' | 'decimal' | 'numeric' | 'email'
  spellCheck?: boolean
  width?: FieldWidth
  /** Inside the field at its right: a unit. */
  unit?: string
  /** A sentence that says why it cannot be changed. */
  offReason?: string
  /** The value as understood, under the field; see `ReadBack`. */
  readBack?: ReactNode
  maxLength?: number
}

/** One line of text. */
export function TextField(props: TextFieldProps) {
  const {
    name,
    label,
    help,
    optional,
    hideLabel,
    type = 'text',
    width = 'full',
    unit,
    offReason,
    readBack,
  } = props
  const field = useField(name)
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
      <div className={`relative ${widthClasses[width]}`}>
        <input
          {...field.register()}
          defaultValue={field.initialText}
          id={field.id}
          type={type}
          readOnly={Boolean(offReason)}
          inputMode={props.inputMode}
          autoComplete={props.autoComplete ?? 'off'}
          spellCheck={props.spellCheck ?? false}
          maxLength={props.maxLength}
          aria-invalid={field.error ? true : undefined}
          aria-describedby={describedBy(field, Boolean(shownHelp), unit ? `${field.id}-unit` : false)}
          className={controlClasses(Boolean(field.error), Boolean(offReason))}
          style={unit ? { paddingRight: `${unit.length * 0.6 + 1.5}rem` } : undefined}
        />
        {unit ? (
          <span
            id={`${field.id}-unit`}
            className="pointer-events-none absolute inset-y-0 right-3 flex items-center text-table text-muted"
          >
            {unit}
          </span>
        ) : null}
      </div>
      {readBack}
    </FieldFrame>
  )
}
