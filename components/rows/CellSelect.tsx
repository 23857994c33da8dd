'use client'

import { useFormContext } from 'react-hook-form'
import { classNames } from '@/components/ui/classNames'
import { largeSelect, smallSelect } from './cellClasses'

export interface CellSelectProps {
  name: string
  label: string
  options: readonly { value: string; label: string }[]
  readOnly: boolean
  align?: 'left' | 'right'
  /** Stands in the first line of its cell, as large as typed text. */
  large?: boolean
  /** Options that are numbers. */
  isNumber?: boolean
  onChosen: () => void
}

/** A small choice in the second line of a cell. */
export function CellSelect({
  name,
  label,
  options,
  readOnly,
  align = 'left',
  large,
  isNumber,
  onChosen,
}: CellSelectProps) {
  const { register, formState } = useFormContext()
  return (
    <select
      {...register(name, { onChange: onChosen, valueAsNumber: isNumber })}
      defaultValue={String(formState.defaultValues?.[name] ?? '')}
      aria-label={label}
      disabled={readOnly}
      className={classNames(large ? largeSelect : smallSelect, align === 'right' && 'text-right')}
    >
      {options.map((option) => (
        <option key={option.value} value={option.value}>
          {option.label}
        </option>
      ))}
    </select>
  )
}
