'use client'

import { TableFrame } from '@/components/tables/TableFrame'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import type { TargetRow } from '@/lib/domain/targets/schema'
import { cellClasses } from '@/components/rows/cellClasses'
import { cellNames } from './cellNames'
import type { Import, ReadFile } from './useImport'

const cells: readonly (keyof TargetRow)[] = ['name', 'ra', 'dec', 'redshift', 'magnitude', 'band']
const standingWords = { new: 'new', same: 'here already', clash: 'clashes', wrong: 'to mend' } as const

/** Every row of a file, each cell open to be mended; a row can be left out. */
export function ImportRows({ file, incoming }: { file: ReadFile; incoming: Import }) {
  return (
    <div className="mt-4 max-h-96 overflow-y-auto">
      <TableFrame caption={`Rows of ${file.name}`} phone="cards">
        <thead role="rowgroup">
          <tr role="row">
            {['Row', ...cells.map((cell) => cellNames[cell]), 'Standing', ''].map((head) => (
              <th key={head} role="columnheader" scope="col">
                {head || <span className="sr-only">Leave out</span>}
              </th>
            ))}
          </tr>
        </thead>
        <tbody role="rowgroup">
          {file.rows.map(({ number, row, errors }, index) => (
            <tr
              key={number}
              role="row"
              className={
                ['wrong', 'clash'].includes(incoming.standings[index] ?? '') ? 'is-attention' : undefined
              }
            >
              <th role="rowheader" scope="row">
                {number}
              </th>
              {cells.map((cell) => (
                <td key={cell} role="cell" data-head={cellNames[cell]}>
                  <input
                    value={row[cell]}
                    aria-label={`${cellNames[cell]} of row ${number}`}
                    aria-invalid={errors[cell] ? true : undefined}
                    onChange={(event) => incoming.change(number, cell, event.target.value)}
                    className={cellClasses({ wrong: Boolean(errors[cell]) })}
                  />
                  {errors[cell] ? (
                    <span className="block text-caption text-not-feasible">{errors[cell]}</span>
                  ) : null}
                </td>
              ))}
              <td role="cell" data-head="Standing" className="text-muted">
                {standingWords[incoming.standings[index] ?? 'new']}
              </td>
              <td role="cell" data-head="">
                <LinkLikeButton
                  aria-label={`Leave row ${number} out`}
                  onClick={() => incoming.leaveOut(number)}
                >
                  out
                </LinkLikeButton>
              </td>
            </tr>
          ))}
        </tbody>
      </TableFrame>
    </div>
  )
}
