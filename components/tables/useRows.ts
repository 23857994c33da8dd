'use client'

import { useTable, type RowData } from '@tanstack/react-table'
import { useMemo } from 'react'
import { columnDefs } from './columnDefs'
import { features } from './features'
import { plainText } from './plainText'
import { sortingOf } from './sortingOf'
import type { CellValue, TableChip, TableColumn } from './tableColumn'
import type { TableState } from './useTableState'

/** The rows to show, in order: chip first, then the search, then the sort. */
export function useRows<Row extends RowData>(
  rows: readonly Row[],
  columns: readonly TableColumn<Row>[],
  chips: readonly TableChip<Row>[],
  state: TableState,
): Row[] {
  const definitions = useMemo(() => columnDefs(columns), [columns])
  const chip = chips.find(({ id }) => id === state.show)
  const data = useMemo(() => (chip ? rows.filter(chip.matches) : [...rows]), [rows, chip])
  const sorting = useMemo(
    () =>
      sortingOf(
        state.sort,
        columns.map(({ id }) => id),
      ),
    [state.sort, columns],
  )
  const table = useTable({
    features,
    columns: definitions,
    data,
    state: { sorting, globalFilter: state.find, columnFilters: [] },
    getColumnCanGlobalFilter: () => true,
    globalFilterFn: (row, columnId, wanted: string) =>
      plainText(row.getValue<CellValue>(columnId)).toLowerCase().includes(wanted.trim().toLowerCase()),
  })
  const model = table.getRowModel()
  return useMemo(() => model.rows.map((row) => row.original), [model])
}
