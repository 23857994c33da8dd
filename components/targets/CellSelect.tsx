'use client'

import { useFormContext } from 'react-hook-form'
import { classNames } from '@/components/ui/classNames'
import type { TargetRow } from '@/lib/domain/targets/schema'
import { smallSelect } from './cellClasses'

export interface CellSelectProps {
  name: keyof TargetRow
  label: string
  options: readonly { value: string; label: string }[]
  readOnly: boolean
  align?: 'left' | 'right'
  onChosen: () => void
}

/** A small choice in the second line of a cell. */
export function CellSelect({ name, label, options, readOnly, align = 'left', onChosen }: CellSelectProps) {
  const { register, formState } = useFormContext<TargetRow>()
  return (
    <select
      {...register(name, { onChange: onChosen })}
      defaultValue={formState.defaultValues?.[name]}
      aria-label={label}
      disabled={readOnly}
      className={classNames(smallSelect, align === 'right' && 'text-right')}
    >
      {options.map((option) => (
        <option key={option.value} value={option.value}>
          {option.label}
        </option>
      ))}
    </select>
  )
}
