'use client'

import type { ReactNode } from 'react'
import { classNames } from '@/components/ui/classNames'
import { describedBy } from './describedBy'
import { useField } from './useField'

export interface CheckboxFieldProps {
  name: string
  label: ReactNode
  help?: ReactNode
  /** Several boxes of one name make a list of these values. */
  value?: string
  offReason?: string
}

/** A yes or no. */
export function CheckboxField({ name, label, help, value, offReason }: CheckboxFieldProps) {
  const field = useField(name)
  const id = value === undefined ? field.id : `${field.id}-${value}`
  const shownHelp = offReason ?? help
  return (
    <div className={classNames(field.error && 'border-l-4 border-not-feasible pl-3')}>
      {field.error ? (
        <p id={field.errorId} className="m-0 mb-1 text-table font-semibold text-not-feasible">
          {field.error}
        </p>
      ) : null}
      <div className="flex gap-3">
        <input
          {...field.register()}
          id={id}
          type="checkbox"
          value={value}
          defaultChecked={
            value === undefined
              ? field.initial === true
              : Array.isArray(field.initial) && field.initial.includes(value)
          }
          disabled={Boolean(offReason)}
          aria-invalid={field.error ? true : undefined}
          aria-describedby={describedBy(field, Boolean(shownHelp))}
          className="checkbox"
        />
        <div>
          <label htmlFor={id} className="text-body">
            {label}
          </label>
          {shownHelp ? (
            <p id={field.helpId} className="m-0 text-caption text-muted">
              {shownHelp}
            </p>
          ) : null}
        </div>
      </div>
    </div>
  )
}
