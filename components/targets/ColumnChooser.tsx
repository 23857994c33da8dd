'use client'

import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { Popover } from '@/components/ui/Popover'
import { numberColumns, type NumberColumnId } from './numberColumns'

export interface ColumnChooserProps {
  shown: readonly NumberColumnId[]
  onChange: (shown: NumberColumnId[]) => void
}

/** Which computed columns stand in the table. */
export function ColumnChooser({ shown, onChange }: ColumnChooserProps) {
  const toggle = (id: NumberColumnId) =>
    onChange(
      numberColumns
        .map((column) => column.id)
        .filter((column) => (column === id ? !shown.includes(id) : shown.includes(column))),
    )
  return (
    <Popover trigger={<LinkLikeButton>Columns</LinkLikeButton>} label="Computed columns">
      <fieldset className="m-0 border-0 p-0">
        <legend className="mb-2 p-0 text-body font-semibold">Computed columns</legend>
        <div className="flex flex-col gap-2">
          {numberColumns.map(({ id, what, unit }) => (
            <label key={id} className="flex items-center gap-3">
              <input
                type="checkbox"
                className="checkbox"
                checked={shown.includes(id)}
                onChange={() => toggle(id)}
              />
              <span>
                {what}, <span className="text-muted">{unit}</span>
              </span>
            </label>
          ))}
        </div>
      </fieldset>
    </Popover>
  )
}
