import { createColumnHelper, type ColumnDef, type RowData } from '@tanstack/react-table'
import { compareValues } from './compareValues'
import type { features } from './features'
import { isAbsent } from './isAbsent'
import type { CellValue, TableColumn } from './tableColumn'

/** Our columns as the table library wants them. An absent value is `undefined` there, which it keeps last. */
export function columnDefs<Row extends RowData>(
  columns: readonly TableColumn<Row>[],
): ColumnDef<typeof features, Row, unknown>[] {
  const helper = createColumnHelper<typeof features, Row>()
  return columns.map((column) =>
    helper.accessor(
      (row): unknown => {
        const value = column.value(row)
        return isAbsent(value) ? undefined : value
      },
      {
        id: column.id,
        enableSorting: column.sortable !== false,
        sortUndefined: 'last',
        sortDescFirst: false,
        sortFn: (a, b) => compareValues(a.getValue<CellValue>(column.id), b.getValue<CellValue>(column.id)),
      },
    ),
  )
}
