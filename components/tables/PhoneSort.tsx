'use client'

import { useId } from 'react'
import type { TableColumn } from './tableColumn'

export interface PhoneSortProps<Row> {
  columns: readonly TableColumn<Row>[]
  sort: string
  onSort: (sort: string) => void
}

/** Cards have no heads to press: on phones the order is chosen here. */
export function PhoneSort<Row>({ columns, sort, onSort }: PhoneSortProps<Row>) {
  const id = useId()
  return (
    <div className="flex w-full items-center gap-3 sm:hidden">
      <label htmlFor={id} className="text-table whitespace-nowrap text-muted">
        Order by
      </label>
      <select
        id={id}
        value={sort}
        onChange={(event) => onSort(event.target.value)}
        className="min-h-11 min-w-0 grow rounded border border-edge bg-surface px-3 text-table"
      >
        <option value="">as given</option>
        {columns
          .filter((column) => column.sortable !== false)
          .flatMap((column) => [
            <option key={column.id} value={column.id}>
              {column.head}, smallest first
            </option>,
            <option key={`-${column.id}`} value={`-${column.id}`}>
              {column.head}, largest first
            </option>,
          ])}
      </select>
    </div>
  )
}
