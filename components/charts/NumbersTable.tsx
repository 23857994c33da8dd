import { TableFrame } from '@/components/tables/TableFrame'
import { ABSENT, formatNumber, type CsvValue } from '@/lib/format'

export interface NumbersColumn {
  head: string
  unit?: string
  /** For numbers: they stand right. */
  decimals?: number
}

/** The numbers behind a chart, as plain data. */
export interface Numbers {
  caption: string
  columns: readonly NumbersColumn[]
  rows: readonly (readonly CsvValue[])[]
}

/** The twin of a chart: the same numbers as a table. */
export function NumbersTable({ numbers: { caption, columns, rows } }: { numbers: Numbers }) {
  return (
    <TableFrame caption={caption} phone="scroll">
      <thead role="rowgroup">
        <tr role="row">
          {columns.map(({ head, unit, decimals }) => (
            <th
              key={head}
              role="columnheader"
              scope="col"
              className={decimals === undefined ? undefined : 'is-right'}
            >
              {head}
              {unit ? <span className="unit">{unit}</span> : null}
            </th>
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup">
        {rows.map((row, index) => (
          <tr key={index} role="row">
            {columns.map(({ head, decimals }, at) => {
              const value = row[at]
              const text =
                typeof value === 'number' ? formatNumber(value, decimals ?? 0) : String(value ?? ABSENT)
              return (
                <td key={head} role="cell" className={decimals === undefined ? undefined : 'is-right'}>
                  {text}
                </td>
              )
            })}
          </tr>
        ))}
      </tbody>
    </TableFrame>
  )
}
