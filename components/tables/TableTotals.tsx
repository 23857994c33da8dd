import { classNames } from '@/components/ui/classNames'
import type { TableColumn } from './tableColumn'

export interface TableTotalsProps<Row> {
  columns: readonly TableColumn<Row>[]
  rows: readonly Row[]
}

/** The closing row, double ruled; there is none when no column has a total. */
export function TableTotals<Row>({ columns, rows }: TableTotalsProps<Row>) {
  if (!columns.some((column) => column.total)) return null
  return (
    <tfoot role="rowgroup">
      <tr role="row">
        {columns.map((column) => (
          <td
            key={column.id}
            role="cell"
            data-head={column.head}
            className={classNames(
              column.align === 'right' && 'is-right',
              column.computed && 'is-computed',
              !column.total && 'is-blank',
            )}
          >
            {column.total?.(rows)}
          </td>
        ))}
      </tr>
    </tfoot>
  )
}
