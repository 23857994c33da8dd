'use client'

import { TableFrame } from '@/components/tables/TableFrame'
import { VerdictMark } from '@/components/ui/VerdictMark'
import { countInWords, formatNumber } from '@/lib/format'
import type { ProposalComputation } from '@/lib/domain/observations/types'
import { ObservationTableRow, type ObservationTableRowProps } from './ObservationTableRow'

export interface ObservationTableProps extends Pick<
  ObservationTableRowProps,
  'contents' | 'readOnly' | 'onTyped'
> {
  computation: ProposalComputation
  save: (id: number) => ObservationTableRowProps['save']
  onRemove: (id: number) => void
}

const heads: readonly { head: string; unit?: string; right?: boolean; computed?: boolean }[] = [
  { head: 'Target' },
  { head: 'Mode', unit: 'on offer in this call' },
  { head: 'Feature', unit: 'where it falls' },
  { head: 'S/N wanted', unit: 'and what it counts', right: true },
  { head: 'exposure', unit: 'open shutter', right: true, computed: true },
  { head: 'needed', unit: 'h', right: true, computed: true },
  { head: 'asked', unit: 'h', right: true },
  { head: 'verdict' },
]

/** What is to be measured: a row an observation, and what they come to. */
export function ObservationTable(props: ObservationTableProps) {
  const { contents, computation, readOnly, onTyped, save, onRemove } = props
  return (
    <TableFrame caption="Observations" phone="cards" isTyped>
      <thead role="rowgroup">
        <tr role="row">
          {heads.map(({ head, unit, right, computed }) => (
            <th
              key={head}
              role="columnheader"
              scope="col"
              className={`${right ? 'is-right' : ''} ${computed ? 'is-computed' : ''}`}
            >
              {head}
              {unit ? <span className="unit">{unit}</span> : null}
            </th>
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup">
        {contents.observations.map((kept, index) => (
          <ObservationTableRow
            key={kept.id}
            contents={contents}
            kept={kept}
            number={index + 1}
            computed={computation.observations.find(({ observationId }) => observationId === kept.id)}
            readOnly={readOnly}
            onTyped={onTyped}
            save={save(kept.id)}
            onRemove={() => onRemove(kept.id)}
          />
        ))}
      </tbody>
      <tfoot role="rowgroup">
        <tr role="row">
          <td role="cell" colSpan={5} data-head="All">
            {countInWords(contents.observations.length, 'observation', 'observations', true)}
          </td>
          <td role="cell" className="is-right is-computed" data-head="Needed, h">
            {formatNumber(computation.neededSeconds / 3600, 1)}
          </td>
          <td role="cell" className="is-right" data-head="Asked, h">
            {formatNumber(computation.askedSeconds / 3600, 1)}
          </td>
          <td role="cell" data-head="Verdict" className="whitespace-nowrap">
            {computation.verdict ? <VerdictMark verdict={computation.verdict} strong /> : null}
          </td>
        </tr>
      </tfoot>
    </TableFrame>
  )
}
