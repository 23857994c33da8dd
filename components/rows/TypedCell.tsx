'use client'

import { useFormContext } from 'react-hook-form'
import { cellClasses } from './cellClasses'
import { moveBetweenCells } from './moveBetweenCells'

export interface TypedCellProps {
  name: string
  /** Names the cell for screen readers: `Redshift of HE 0047−1756`. */
  label: string
  /** The row's place, for moving down with Enter. */
  row: number
  align?: 'left' | 'right'
  strong?: boolean
  readOnly: boolean
  placeholder?: string
  /** The id of the message under the row, when there is one. */
  messageId: string
  onPasteText?: (text: string) => boolean
}

/** A cell to type in: dotted line at rest, boxed in focus, a heavy red line while it cannot be read. */
export function TypedCell(props: TypedCellProps) {
  const { name, label, row, align = 'left', strong, readOnly, placeholder, messageId, onPasteText } = props
  const { register, resetField, trigger, getFieldState, formState } = useFormContext()
  const { error } = getFieldState(name, formState)
  return (
    <input
      {...register(name, { onChange: () => (error ? void trigger(name) : undefined) })}
      // What the server sends must show the text before the form wakes up.
      defaultValue={formState.defaultValues?.[name] as string | undefined}
      aria-label={label}
      aria-invalid={error ? true : undefined}
      aria-describedby={error ? messageId : undefined}
      data-row={row}
      data-cell={name}
      readOnly={readOnly}
      autoComplete="off"
      spellCheck={false}
      placeholder={placeholder}
      onKeyDown={(event) => {
        if (event.key === 'Escape') resetField(name)
        moveBetweenCells(event)
      }}
      onPaste={(event) => {
        if (onPasteText?.(event.clipboardData.getData('text'))) event.preventDefault()
      }}
      className={cellClasses({ align, strong, wrong: Boolean(error), readOnly })}
    />
  )
}
