'use client'

import type { RowData } from '@tanstack/react-table'
import { useEffect, useState, type ReactNode } from 'react'
import { Button } from '@/components/ui/Button'
import { TableBody } from './TableBody'
import { TableFrame } from './TableFrame'
import type { TableGroup } from './TableGroups'
import { TableHead } from './TableHead'
import { TableTools } from './TableTools'
import { TableTotals } from './TableTotals'
import type { TableChip, TableColumn } from './tableColumn'
import { useRows } from './useRows'
import { useRowWindow } from './useRowWindow'
import { useTableState } from './useTableState'

export type RowTone = 'attention' | 'feasible' | 'marginal' | 'not-feasible'

export interface DataTableProps<Row> {
  /** Names the table for screen readers; also shown where no title stands above. */
  caption: string
  columns: readonly TableColumn<Row>[]
  rows: readonly Row[]
  rowId: (row: Row) => string
  /** What stands instead of an empty table: an `EmptyState`. */
  empty?: ReactNode
  /** The words in the search box, `Reference or name`; without them there is no box. */
  find?: string
  chips?: readonly TableChip<Row>[]
  /** The name of the file, without its ending; without it there is no CSV. */
  csv?: string
  /** The row that is open beside or below. */
  selectedId?: string | null
  /** Rows that want attention: a wash, and a bar in the verdict's colour. */
  tone?: (row: Row) => RowTone | null
  /** A line of its own under a row. */
  detail?: (row: Row) => ReactNode
  /** Tells the addresses of several tables on a page apart. */
  urlPrefix?: string
  /** On phones: cards (the default over five columns), or sideways scrolling with the first column held. */
  phone?: 'cards' | 'scroll'
  /** Names over neighbouring columns. */
  groups?: readonly TableGroup[]
  /** The one height of its rows, px: a long table is then scrolled in its frame and rendered only where it is seen. */
  rowHeight?: number
  /** How many rows stand at first; a button shows as many more. Search, order and file know them all. */
  page?: number
  /** Told of the rows shown, in their order, so that files hold the same. */
  onShown?: (rows: readonly Row[]) => void
  /** More at the right of the tools: links, a small button. */
  actions?: ReactNode
}

/** Every table of the product: sorts, searches, filters, exports what is shown, keeps its state in the address. */
export function DataTable<Row extends RowData>(props: DataTableProps<Row>) {
  const { caption, columns, rows, rowId, empty, find, chips = [], csv, urlPrefix = '', actions } = props
  const [state, setState] = useTableState(urlPrefix)
  const shown = useRows(rows, columns, chips, state)
  const [pages, setPages] = useState(1)
  const standing = props.page === undefined ? shown : shown.slice(0, props.page * pages)
  const { frame, view } = useRowWindow(standing.length, props.rowHeight)
  const { onShown } = props
  useEffect(() => onShown?.(shown), [onShown, shown])
  const phone = props.phone ?? (columns.length > 5 ? 'cards' : 'scroll')
  const change = (next: Partial<typeof state>) => void setState(next)

  if (rows.length === 0 && empty) return <>{empty}</>
  return (
    <div>
      <TableTools
        find={find}
        chips={chips}
        columns={columns}
        rows={rows}
        shown={shown}
        csv={csv}
        state={state}
        onChange={change}
        phoneSort={phone === 'cards'}
        actions={actions}
      />
      <TableFrame
        caption={caption}
        phone={phone}
        frame={frame}
        rowCount={view ? shown.length + 1 : undefined}
      >
        <TableHead
          columns={columns}
          sort={state.sort}
          onSort={(sort) => change({ sort })}
          groups={props.groups}
        />
        <TableBody
          {...props}
          rows={standing}
          rowId={rowId}
          view={view}
          onShowAll={() => change({ find: '', show: '' })}
        />
        <TableTotals columns={columns} rows={shown} />
      </TableFrame>
      {props.page !== undefined && standing.length < shown.length ? (
        <p className="mt-4 mb-0 flex flex-wrap items-center gap-4 text-table" data-no-print>
          <Button look="secondary" size="small" onClick={() => setPages(pages + 1)}>
            {`Show ${Math.min(props.page, shown.length - standing.length)} more`}
          </Button>
          <span className="text-muted">{`${standing.length} of ${shown.length} stand here; the file holds all of them.`}</span>
        </p>
      ) : null}
    </div>
  )
}
