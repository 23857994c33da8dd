'use client'

import { ChevronDown } from 'lucide-react'
import type { ReactNode } from 'react'
import { classNames } from '@/components/ui/classNames'
import { controlClasses } from './controlClasses'
import { describedBy } from './describedBy'
import { FieldFrame } from './FieldFrame'
import { useField } from './useField'
import { widthClasses, type FieldWidth } from './widthClasses'

export interface SelectOption {
  value: string
  label: string
  /** Options with the same group stand together under its name. */
  group?: string
}

export interface SelectFieldProps {
  name: string
  label: ReactNode
  help?: ReactNode
  optional?: boolean
  hideLabel?: boolean
  options: readonly SelectOption[]
  /** The line shown while nothing is chosen; its value is the empty text. */
  placeholder?: string
  width?: FieldWidth
  offReason?: string
}

function optionTags(options: readonly SelectOption[]) {
  const groups = [...new Set(options.map((option) => option.group))]
  const tags = (group: string | undefined) =>
    options
      .filter((option) => option.group === group)
      .map(({ value, label }) => (
        <option key={value} value={value}>
          {label}
        </option>
      ))
  return groups.map((group) =>
    group ? (
      <optgroup key={group} label={group}>
        {tags(group)}
      </optgroup>
    ) : (
      tags(undefined)
    ),
  )
}

/** One of a list, by the browser's own control, so that phones and keyboards know it. */
export function SelectField(props: SelectFieldProps) {
  const { name, label, help, optional, hideLabel, options, placeholder, width = 'full', offReason } = props
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
        <select
          {...field.register()}
          defaultValue={field.initialText}
          id={field.id}
          disabled={Boolean(offReason)}
          aria-invalid={field.error ? true : undefined}
          aria-describedby={describedBy(field, Boolean(shownHelp))}
          className={classNames(
            controlClasses(Boolean(field.error), Boolean(offReason)),
            'appearance-none pr-9',
          )}
        >
          {placeholder ? <option value="">{placeholder}</option> : null}
          {optionTags(options)}
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
