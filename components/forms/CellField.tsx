'use client'

import { classNames } from '@/components/ui/classNames'
import { describedBy } from './describedBy'
import { useField } from './useField'

export interface CellFieldProps {
  name: string
  /** For screen readers, with its row: `Hours asked, HE 0230−2130`. */
  label: string
  align?: 'left' | 'right'
  inputMode?: 'text' | 'decimal' | 'numeric'
  strong?: boolean
}

/** A cell one types in: dotted underneath, boxed while it has the focus. */
export function CellField({
  name,
  label,
  align = 'left',
  inputMode = 'text',
  strong = false,
}: CellFieldProps) {
  const field = useField(name)
  return (
    <span className="block">
      <input
        {...field.register()}
        defaultValue={field.initialText}
        id={field.id}
        aria-label={label}
        inputMode={inputMode}
        autoComplete="off"
        spellCheck={false}
        aria-invalid={field.error ? true : undefined}
        aria-describedby={describedBy(field, false)}
        className={classNames('cell-field', align === 'right' && 'text-right', strong && 'font-semibold')}
      />
      {field.error ? (
        <span id={field.errorId} className="block text-tick font-semibold text-not-feasible">
          {field.error}
        </span>
      ) : null}
    </span>
  )
}
