'use client'

import { ChevronDown } from 'lucide-react'
import { useId } from 'react'
import { FieldFrame } from '@/components/forms/FieldFrame'
import { controlClasses } from '@/components/forms/controlClasses'
import { classNames } from '@/components/ui/classNames'

export interface PlainSelectProps<Value extends string> {
  label: string
  help?: string
  hideLabel?: boolean
  options: readonly { value: Value; label: string }[]
  value: Value
  onChange: (value: Value) => void
}

/** One of a list, by the browser's own control. */
export function PlainSelect<Value extends string>(props: PlainSelectProps<Value>) {
  const { label, help, hideLabel, options, value, onChange } = props
  const id = useId()
  return (
    <FieldFrame
      htmlFor={id}
      label={label}
      help={help}
      helpId={`${id}-help`}
      errorId={`${id}-error`}
      hideLabel={hideLabel}
    >
      <div className="relative">
        <select
          id={id}
          value={value}
          onChange={(event) => {
            const chosen = options.find((option) => option.value === event.target.value)
            if (chosen) onChange(chosen.value)
          }}
          aria-describedby={help ? `${id}-help` : undefined}
          className={classNames(controlClasses(false, false), 'appearance-none truncate pr-9')}
        >
          {options.map((option) => (
            <option key={option.value} value={option.value}>
              {option.label}
            </option>
          ))}
        </select>
        <ChevronDown
          size={16}
          aria-hidden="true"
          className="pointer-events-none absolute top-1/2 right-3 -translate-y-1/2"
        />
      </div>
    </FieldFrame>
  )
}
