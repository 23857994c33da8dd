import { Fragment, type ReactNode } from 'react'
import { classNames } from '@/components/ui/classNames'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import type { DataTableProps } from './DataTable'
import { TableCell } from './TableCell'
import type { RowWindow } from './useRowWindow'

export interface TableBodyProps<Row> extends Pick<
  DataTableProps<Row>,
  'columns' | 'rows' | 'rowId' | 'selectedId' | 'tone' | 'detail'
> {
  onShowAll: () => void
  /** The part of a long table to render. */
  view?: RowWindow | null
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

/** The room of rows that are not rendered. */
function Gap({ span, height }: { span: number; height: number }) {
  return (
    <tr aria-hidden="true" className="is-gap">
      <td colSpan={span} style={{ height, padding: 0 }} />
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
  view,
}: TableBodyProps<Row>) {
  const part = view ? rows.slice(view.from, view.to) : rows
  return (
    <tbody role="rowgroup">
      {rows.length === 0 ? (
        <FullRow span={columns.length}>
          <span className="text-muted">Nothing matches. </span>
          <LinkLikeButton onClick={onShowAll}>Show all</LinkLikeButton>
        </FullRow>
      ) : null}
      {view && view.above > 0 ? <Gap span={columns.length} height={view.above} /> : null}
      {part.map((row, index) => {
        const id = rowId(row)
        const selected = id === selectedId
        const rowTone = tone?.(row) ?? null
        const more = detail?.(row)
        const marks = classNames(selected && 'is-selected', rowTone && `is-${rowTone}`)
        return (
          <Fragment key={id}>
            <tr
              role="row"
              aria-rowindex={view ? view.from + index + 2 : undefined}
              aria-current={selected || undefined}
              className={classNames(marks, more ? 'has-detail' : null)}
            >
              {columns.map((column, at) => (
                <TableCell key={column.id} column={column} row={row} first={at === 0} />
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
      {view && view.below > 0 ? <Gap span={columns.length} height={view.below} /> : null}
    </tbody>
  )
}
