import { classNames } from '@/components/ui/classNames'
import { ABSENT } from '@/lib/format'
import { isAbsent } from './isAbsent'
import { plainText } from './plainText'
import type { TableColumn } from './tableColumn'

export interface TableCellProps<Row> {
  column: TableColumn<Row>
  row: Row
  first: boolean
}

/** One cell. The first of a row is its name: bold, and what a screen reader says before the others. */
export function TableCell<Row>({ column, row, first }: TableCellProps<Row>) {
  const span = column.span?.(row) ?? 1
  if (span === 0) return null
  const value = column.value(row)
  const absent = isAbsent(value) && !column.cell
  const className = classNames(
    column.align === 'right' && 'is-right',
    column.computed && 'is-computed',
    column.wide && !isAbsent(value) && 'is-wide',
    absent && 'is-absent',
  )
  const content = column.cell ? column.cell(row) : absent ? ABSENT : plainText(value)
  if (first) {
    return (
      <th role="rowheader" scope="row" className={className}>
        {content}
      </th>
    )
  }
  return (
    <td
      role="cell"
      colSpan={span > 1 ? span : undefined}
      data-head={column.unit ? `${column.head}, ${column.unit}` : column.head}
      className={className}
    >
      {content}
    </td>
  )
}
