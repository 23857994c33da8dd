'use client'

import type { ReactNode } from 'react'
import { describedBy } from './describedBy'
import { FieldFrame } from './FieldFrame'
import { useField } from './useField'

export interface CheckListOption {
  value: string
  label: ReactNode
  /** Beside the label, muted. */
  note?: ReactNode
}

export interface CheckListFieldProps {
  name: string
  label: ReactNode
  help?: ReactNode
  options: readonly CheckListOption[]
}

/** Several of many; a long list scrolls within its frame. */
export function CheckListField({ name, label, help, options }: CheckListFieldProps) {
  const field = useField(name)
  const chosen = Array.isArray(field.initial) ? (field.initial as unknown[]) : []
  return (
    <FieldFrame {...field} as="fieldset" label={label} help={help}>
      <div className="max-h-72 overflow-y-auto border-y border-rule py-2" tabIndex={-1}>
        {options.map(({ value, label: words, note }, index) => {
          const id = index === 0 ? field.id : `${field.id}-${value}`
          return (
            <div key={value} className="flex items-center gap-3 py-1 pl-1 max-sm:min-h-11">
              <input
                {...field.register()}
                id={id}
                type="checkbox"
                value={value}
                defaultChecked={chosen.includes(value)}
                aria-invalid={field.error ? true : undefined}
                aria-describedby={describedBy(field, Boolean(help))}
                className="checkbox"
              />
              <label htmlFor={id} className="text-table">
                {words}
                {note ? <span className="text-muted"> {note}</span> : null}
              </label>
            </div>
          )
        })}
      </div>
    </FieldFrame>
  )
}
