'use client'

import { useId, type ReactNode } from 'react'
import { Chip } from '@/components/ui/Chip'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { PhoneSort } from './PhoneSort'
import { saveText } from './saveText'
import { tableCsv } from './tableCsv'
import type { TableChip, TableColumn } from './tableColumn'
import type { TableState } from './useTableState'

export interface TableToolsProps<Row> {
  find?: string
  chips: readonly TableChip<Row>[]
  columns: readonly TableColumn<Row>[]
  rows: readonly Row[]
  shown: readonly Row[]
  csv?: string
  state: TableState
  onChange: (next: Partial<TableState>) => void
  phoneSort: boolean
  actions?: ReactNode
}

/** Above a table: the search box, the chips with their counts, and the file of what is shown. */
export function TableTools<Row>(props: TableToolsProps<Row>) {
  const { find, chips, columns, rows, shown, csv, state, onChange, phoneSort, actions } = props
  const id = useId()
  const chosen = chips.some((chip) => chip.id === state.show) ? state.show : ''
  const narrowed = state.find !== '' || chosen !== ''
  if (!find && chips.length === 0 && !csv && !actions && !phoneSort) return null
  return (
    <div className="mb-4 flex flex-wrap items-center gap-x-4 gap-y-2" data-no-print>
      {find ? (
        <>
          <label htmlFor={id} className="sr-only">
            {find}
          </label>
          <input
            id={id}
            type="search"
            value={state.find}
            placeholder={find}
            onChange={(event) => onChange({ find: event.target.value })}
            className="min-h-9 w-60 rounded border border-edge bg-surface px-3 text-table max-sm:min-h-11 max-sm:w-full"
          />
        </>
      ) : null}
      {chips.length > 0 ? (
        <div role="group" aria-label="Show" className="flex flex-wrap items-center gap-3">
          <Chip label={`All ${rows.length}`} pressed={chosen === ''} onPress={() => onChange({ show: '' })} />
          {chips.map((chip) => (
            <Chip
              key={chip.id}
              label={`${chip.label} ${rows.filter(chip.matches).length}`}
              pressed={chosen === chip.id}
              onPress={() => onChange({ show: chip.id })}
            />
          ))}
        </div>
      ) : null}
      {phoneSort ? (
        <PhoneSort columns={columns} sort={state.sort} onSort={(sort) => onChange({ sort })} />
      ) : null}
      <span role="status" className="text-caption text-muted">
        {narrowed ? `${shown.length} of ${rows.length} shown` : ''}
      </span>
      <div className="ml-auto flex flex-wrap items-center gap-4 text-table">
        {csv ? (
          <LinkLikeButton onClick={() => saveText(`${csv}.csv`, tableCsv(columns, shown))}>
            CSV
          </LinkLikeButton>
        ) : null}
        {actions}
      </div>
    </div>
  )
}
