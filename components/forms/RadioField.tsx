'use client'

import type { ReactNode } from 'react'
import { describedBy } from './describedBy'
import { FieldFrame } from './FieldFrame'
import { useField } from './useField'

export interface RadioOption {
  value: string
  label: ReactNode
  help?: ReactNode
}

export interface RadioFieldProps {
  name: string
  label: ReactNode
  help?: ReactNode
  hideLabel?: boolean
  options: readonly RadioOption[]
  offReason?: string
}

/** One of a few, all in sight. */
export function RadioField({ name, label, help, hideLabel, options, offReason }: RadioFieldProps) {
  const field = useField(name)
  const shownHelp = offReason ?? help
  return (
    <FieldFrame {...field} as="fieldset" label={label} help={shownHelp} hideLabel={hideLabel}>
      <div className="flex flex-col gap-3 py-1">
        {options.map((option, index) => {
          const id = index === 0 ? field.id : `${field.id}-${option.value}`
          return (
            <div key={option.value} className="flex gap-3">
              <input
                {...field.register()}
                id={id}
                type="radio"
                value={option.value}
                defaultChecked={field.initial === option.value}
                disabled={Boolean(offReason)}
                aria-describedby={describedBy(field, Boolean(shownHelp), option.help ? `${id}-about` : false)}
                className="radio"
              />
              <div>
                <label htmlFor={id} className="text-body">
                  {option.label}
                </label>
                {option.help ? (
                  <p id={`${id}-about`} className="m-0 text-caption text-muted">
                    {option.help}
                  </p>
                ) : null}
              </div>
            </div>
          )
        })}
      </div>
    </FieldFrame>
  )
}
