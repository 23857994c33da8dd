import { classNames } from '@/components/ui/classNames'
import { nextSort } from './sortingOf'
import type { TableColumn } from './tableColumn'
import { TableGroups, type TableGroup } from './TableGroups'

export interface TableHeadProps<Row> {
  columns: readonly TableColumn<Row>[]
  sort: string
  onSort: (sort: string) => void
  groups?: readonly TableGroup[]
}

/** 8 px, pointing the way the values grow. */
function SortArrow({ down }: { down: boolean }) {
  return (
    <svg
      width="8"
      height="8"
      viewBox="0 0 8 8"
      aria-hidden="true"
      focusable="false"
      className="ml-1 inline-block"
    >
      <path d={down ? 'M0 1.5H8L4 7Z' : 'M0 6.5H8L4 1Z'} fill="currentColor" />
    </svg>
  )
}

/** The head: words that sort, units under them, aligned with their columns. */
export function TableHead<Row>({ columns, sort, onSort, groups }: TableHeadProps<Row>) {
  return (
    <thead role="rowgroup">
      {groups ? <TableGroups groups={groups} /> : null}
      <tr role="row">
        {columns.map((column) => {
          const direction =
            sort === column.id ? 'ascending' : sort === `-${column.id}` ? 'descending' : undefined
          return (
            <th
              key={column.id}
              role="columnheader"
              scope="col"
              aria-sort={column.sortable === false ? undefined : (direction ?? 'none')}
              style={column.width ? { minWidth: column.width } : undefined}
              className={classNames(column.align === 'right' && 'is-right', column.computed && 'is-computed')}
            >
              {column.sortable === false ? (
                (column.shownHead ?? column.head)
              ) : (
                <button type="button" onClick={() => onSort(nextSort(sort, column.id))}>
                  {column.shownHead ?? column.head}
                  {direction ? <SortArrow down={direction === 'descending'} /> : null}
                </button>
              )}
              {column.unit ? <span className="unit">{column.unit}</span> : null}
            </th>
          )
        })}
      </tr>
    </thead>
  )
}
