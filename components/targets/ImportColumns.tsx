'use client'

import { TableFrame } from '@/components/tables/TableFrame'
import { largeSelect } from '@/components/rows/cellClasses'
import { describeColumns, type TargetColumn } from '@/lib/domain/targets/rules'
import { columnNames } from './columnNames'
import type { Import, ReadFile } from './useImport'

const choices = (Object.entries(columnNames) as [TargetColumn, string][]).toSorted(([, a], [, b]) =>
  a.localeCompare(b, 'en-GB'),
)

/** Every column of a file and what it was taken for, open to be taken for something else. */
export function ImportColumns({ file, incoming }: { file: ReadFile; incoming: Import }) {
  return (
    <div className="mt-4 max-h-96 overflow-y-auto">
      <TableFrame caption={`Columns of ${file.name}`} phone="cards">
        <thead role="rowgroup">
          <tr role="row">
            {['Column', 'First cell', 'Read as'].map((head) => (
              <th key={head} role="columnheader" scope="col">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody role="rowgroup">
          {describeColumns(file.table, file.mapping).map(({ name, taken, sample, note, problem }, index) => (
            <tr key={index} role="row" className={problem ? 'is-attention' : undefined}>
              <th role="rowheader" scope="row">
                {name || `column ${index + 1}`}
              </th>
              <td role="cell" data-head="First cell">
                <span className="block max-w-48 truncate">{sample || 'empty'}</span>
              </td>
              <td role="cell" data-head="Read as">
                <div>
                  <select
                    aria-label={`What ${name || `column ${index + 1}`} is read as`}
                    value={taken ?? ''}
                    onChange={(event) =>
                      incoming.takeAs(index, (event.target.value || null) as TargetColumn | null)
                    }
                    className={largeSelect}
                  >
                    <option value="">left out</option>
                    {choices.map(([column, label]) => (
                      <option key={column} value={column}>
                        {label}
                      </option>
                    ))}
                  </select>
                  {problem || note ? (
                    <span className={`block text-caption ${problem ? 'text-not-feasible' : 'text-muted'}`}>
                      {problem ?? note}
                    </span>
                  ) : null}
                </div>
              </td>
            </tr>
          ))}
        </tbody>
      </TableFrame>
    </div>
  )
}
