import { classNames } from '@/components/ui/classNames'
import { SortButton } from './SortButton'
import { nextSort } from './sortingOf'
import type { TableColumn } from './tableColumn'
import { TableGroups, type TableGroup } from './TableGroups'

export interface TableHeadProps<Row> {
  columns: readonly TableColumn<Row>[]
  sort: string
  onSort: (sort: string) => void
  groups?: readonly TableGroup[]
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
                <SortButton direction={direction} onSort={() => onSort(nextSort(sort, column.id))}>
                  {column.shownHead ?? column.head}
                </SortButton>
              )}
              {column.unit ? <span className="unit">{column.unit}</span> : null}
            </th>
          )
        })}
      </tr>
    </thead>
  )
}
