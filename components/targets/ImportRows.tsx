'use client'

import { TableFrame } from '@/components/tables/TableFrame'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import type { TargetRow } from '@/lib/domain/targets/schema'
import { cellClasses } from '@/components/rows/cellClasses'
import { formatNumber } from '@/lib/format'
import { cellNames } from './cellNames'
import type { Standing } from './standingsOf'
import type { Import, ReadFile } from './useImport'

const firstCells: readonly (keyof TargetRow)[] = ['name', 'ra', 'dec', 'redshift', 'magnitude', 'band']
const standingWords = { new: 'new', same: 'here already', clash: 'clashes', wrong: 'to mend' } as const

/** As many as are shown at once. */
const mostShown = 100

const needsMending = (standing: Standing) => standing === 'wrong' || standing === 'clash'

/** The rows of a file, those to mend first, each cell open to be mended; a row can be left out. */
export function ImportRows({ file, incoming }: { file: ReadFile; incoming: Import }) {
  const all = file.rows.map((row, index) => ({ ...row, standing: incoming.standings[index] ?? 'new' }))
  const shown = [
    ...all.filter(({ standing }) => needsMending(standing)),
    ...all.filter(({ standing }) => !needsMending(standing)),
  ].slice(0, mostShown)
  const wrong = new Set(shown.flatMap(({ errors }) => Object.keys(errors) as (keyof TargetRow)[]))
  const cells = [...firstCells, ...[...wrong].filter((cell) => !firstCells.includes(cell))]
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
          {shown.map(({ number, row, errors, standing }) => (
            <tr key={number} role="row" className={needsMending(standing) ? 'is-attention' : undefined}>
              <th role="rowheader" scope="row">
                {number}
              </th>
              {cells.map((cell) => (
                <td key={cell} role="cell" data-head={cellNames[cell]}>
                  <div>
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
                  </div>
                </td>
              ))}
              <td role="cell" data-head="Standing" className="text-muted">
                {standingWords[standing]}
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
      {all.length > mostShown ? (
        <p className="m-0 mt-3 text-caption text-muted">
          {`${mostShown} of ${formatNumber(all.length, 0)} rows stand here, those to mend first.`}
        </p>
      ) : null}
    </div>
  )
}
