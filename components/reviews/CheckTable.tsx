import { TableFrame } from '@/components/tables/TableFrame'
import { VerdictMark } from '@/components/ui/VerdictMark'
import type { FeasibilityCheck } from '@/lib/domain/observations/types'

export interface CheckTableProps {
  caption: string
  rows: readonly (FeasibilityCheck & { key: string; where: string })[]
}

const heads = ['Check', 'Measured', 'Feasible to', 'Fails at', 'Verdict'] as const

/** Checks with what was measured and both limits; why stands under the name where it is not clear. */
export function CheckTable({ caption, rows }: CheckTableProps) {
  return (
    <TableFrame caption={caption} phone="cards">
      <thead>
        <tr role="row">
          {heads.map((head) => (
            <th key={head} role="columnheader" scope="col">
              {head}
            </th>
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup">
        {rows.map((row) => (
          <tr key={row.key} role="row">
            <th role="rowheader" scope="row">
              {row.name}
              <span className="block text-caption font-normal text-muted">{row.where}</span>
              {row.verdict === 'feasible' ? null : (
                <span className="block text-caption font-normal">{row.why}</span>
              )}
            </th>
            <td role="cell" data-head={heads[1]}>
              {row.measured}
            </td>
            <td role="cell" data-head={heads[2]}>
              {row.feasibleTo}
            </td>
            <td role="cell" data-head={heads[3]}>
              {row.failsAt}
            </td>
            <td role="cell" data-head={heads[4]} className="whitespace-nowrap">
              <VerdictMark verdict={row.verdict} />
            </td>
          </tr>
        ))}
      </tbody>
    </TableFrame>
  )
}
