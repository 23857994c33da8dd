import { Fragment, type ReactNode } from 'react'
import { classNames } from '@/components/ui/classNames'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import type { DataTableProps } from './DataTable'
import { TableCell } from './TableCell'

export interface TableBodyProps<Row> extends Pick<
  DataTableProps<Row>,
  'columns' | 'rows' | 'rowId' | 'selectedId' | 'tone' | 'detail'
> {
  onShowAll: () => void
}

function FullRow({ span, children, className }: { span: number; children: ReactNode; className?: string }) {
  return (
    <tr role="row" className={className}>
      <td role="cell" colSpan={span}>
        {children}
      </td>
    </tr>
  )
}

/** The rows, each with its tone and, where there is more to say, a line of its own below. */
export function TableBody<Row>({
  columns,
  rows,
  rowId,
  selectedId,
  tone,
  detail,
  onShowAll,
}: TableBodyProps<Row>) {
  return (
    <tbody role="rowgroup">
      {rows.length === 0 ? (
        <FullRow span={columns.length}>
          <span className="text-muted">Nothing matches. </span>
          <LinkLikeButton onClick={onShowAll}>Show all</LinkLikeButton>
        </FullRow>
      ) : null}
      {rows.map((row) => {
        const id = rowId(row)
        const selected = id === selectedId
        const rowTone = tone?.(row) ?? null
        const more = detail?.(row)
        const marks = classNames(selected && 'is-selected', rowTone && `is-${rowTone}`)
        return (
          <Fragment key={id}>
            <tr
              role="row"
              aria-current={selected || undefined}
              className={classNames(marks, more ? 'has-detail' : null)}
            >
              {columns.map((column, index) => (
                <TableCell key={column.id} column={column} row={row} first={index === 0} />
              ))}
            </tr>
            {more ? (
              <FullRow span={columns.length} className={classNames(marks, 'is-detail')}>
                {more}
              </FullRow>
            ) : null}
          </Fragment>
        )
      })}
    </tbody>
  )
}
