'use client'

import {
  columnVisibilityFeature,
  createColumnHelper,
  tableFeatures,
  useTable,
  type ColumnDef,
} from '@tanstack/react-table'
import { useMemo } from 'react'
import { TableFrame } from '@/components/tables/TableFrame'
import { VerdictMark } from '@/components/ui/VerdictMark'
import { countInWords, formatNumber } from '@/lib/format'
import type { ProposalComputation } from '@/lib/domain/observations/types'
import { columnHead } from './formulas'
import { numberColumns, type NumberColumnId } from './numberColumns'
import { TargetTableRow } from './TargetTableRow'
import type { RowView, TargetTableProps } from './targetTableTypes'

const features = tableFeatures({ columnVisibilityFeature })
const helper = createColumnHelper<typeof features, RowView>()
const definitions: ColumnDef<typeof features, RowView, unknown>[] = numberColumns.map((column) =>
  helper.accessor((view): unknown => (view.computed ? column.value(view.computed) : null), { id: column.id }),
)

export interface TargetTableWholeProps extends Omit<TargetTableProps, 'columns'> {
  shown: readonly NumberColumnId[]
  totals: Pick<ProposalComputation, 'askedSeconds' | 'neededSeconds' | 'verdict'>
  maxAirmass: number
  months: string
}

/** The table of targets: typed cells at the left, computed ones tinted, hours and verdict at the right. */
export function TargetTable(whole: TargetTableWholeProps) {
  const { shown, totals, maxAirmass, months, ...props } = whole
  const columnVisibility = useMemo(
    () => Object.fromEntries(numberColumns.map(({ id }) => [id, shown.includes(id)])),
    [shown],
  )
  const data = useMemo(() => [...props.rows], [props.rows])
  const table = useTable({ features, columns: definitions, data, state: { columnVisibility } })
  const visible = table
    .getVisibleLeafColumns()
    .map((column) => column.id)
    .join()
  const columns = useMemo(() => numberColumns.filter(({ id }) => visible.split(',').includes(id)), [visible])
  const rows = table.getRowModel().rows.map((row) => row.original)
  const required = rows.filter(({ target }) => target.group === null && target.need === 'required').length
  const grouped = rows.filter(({ target }) => target.group !== null).length

  return (
    <TableFrame caption="Targets" phone="cards">
      <thead role="rowgroup">
        <tr role="row">
          <th role="columnheader" scope="col">
            <span className="sr-only">Place</span>
          </th>
          <th role="columnheader" scope="col">
            Name<span className="unit">as the paper spells it</span>
          </th>
          <th role="columnheader" scope="col">
            Position<span className="unit">ICRS; h m s, d m s or degrees</span>
          </th>
          <th role="columnheader" scope="col" className="is-right">
            z<span className="unit">redshift</span>
          </th>
          <th role="columnheader" scope="col" className="is-right">
            magnitude<span className="unit">in a band</span>
          </th>
          {columns.map((column) => (
            <th key={column.id} role="columnheader" scope="col" className="is-right is-computed">
              {columnHead(column.id, column.head)}
              <span className="unit">{column.unit}</span>
            </th>
          ))}
          <th role="columnheader" scope="col" className="is-right is-computed whitespace-nowrap">
            dark, X ≤ {maxAirmass}
            <span className="unit">h, and {months}</span>
          </th>
          <th role="columnheader" scope="col" className="is-right is-computed">
            needed<span className="unit">h</span>
          </th>
          <th role="columnheader" scope="col" className="is-right">
            asked<span className="unit">h</span>
          </th>
          <th role="columnheader" scope="col">
            verdict
          </th>
        </tr>
      </thead>
      <tbody role="rowgroup">
        {rows.map((view, index) => (
          <TargetTableRow
            reference={props.reference}
            readOnly={props.readOnly}
            numbers={props.numbers}
            season={props.season}
            groups={props.groups}
            takesAwaited={props.takesAwaited}
            deeds={props.deeds}
            key={view.key}
            view={view}
            number={index + 1}
            columns={columns}
            isFirst={index === 0}
            isLast={index === rows.length - 1}
          />
        ))}
      </tbody>
      <tfoot role="rowgroup">
        <tr role="row">
          <td role="cell" className="is-blank" />
          <td role="cell" colSpan={4 + columns.length + 1} data-head="All">
            {countInWords(rows.length, 'target', 'targets', true)}
            {required > 0 && required < rows.length ? `, ${required} required` : ''}
            {grouped > 0
              ? `, ${grouped === rows.length ? 'all' : countInWords(grouped, '', '').trim()} in ${countInWords(props.groups.length, 'group')}`
              : ''}
          </td>
          <td role="cell" className="is-right is-computed" data-head="Needed, h">
            {formatNumber(totals.neededSeconds / 3600, 1)}
          </td>
          <td role="cell" className="is-right" data-head="Asked, h">
            {formatNumber(totals.askedSeconds / 3600, 1)}
          </td>
          <td role="cell" data-head="Verdict" className="whitespace-nowrap">
            {totals.verdict ? <VerdictMark verdict={totals.verdict} strong /> : null}
          </td>
        </tr>
      </tfoot>
    </TableFrame>
  )
}
