'use client'

import { NumbersTable } from '@/components/charts/NumbersTable'
import { TableFrame } from '@/components/tables/TableFrame'
import { Button } from '@/components/ui/Button'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import type { TypedRow } from '@/lib/domain/facility/recordForm'
import { columnWords, type TableKind, type TableProblem, type TableRead } from '@/lib/domain/facility/rules'
import { ABSENT, countInWords, formatNumber } from '@/lib/format'
import { RecordTablePlot } from './RecordTablePlot'

const mostProblems = 20

function ProblemRows({ problems }: { problems: readonly TableProblem[] }) {
  return (
    <div className="mt-4">
      <TableFrame caption="Rows to mend" phone="scroll">
        <thead role="rowgroup">
          <tr role="row">
            {['Row', 'Column', 'Says', 'What is wrong'].map((head) => (
              <th key={head} role="columnheader" scope="col">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody role="rowgroup">
          {problems.slice(0, mostProblems).map(({ row, column, text, message }) => (
            <tr key={`${row} ${column} ${message}`} role="row">
              <th role="rowheader" scope="row">
                {row}
              </th>
              <td role="cell">{column}</td>
              <td role="cell">{text === '' ? ABSENT : text}</td>
              <td role="cell">{message}</td>
            </tr>
          ))}
        </tbody>
      </TableFrame>
      {problems.length > mostProblems ? (
        <p className="mt-2 text-table text-muted">
          And {formatNumber(problems.length - mostProblems)} more to mend.
        </p>
      ) : null}
    </div>
  )
}

export interface TablePreviewProps {
  name: string
  read: Extract<TableRead, { ok: true }>
  kind: TableKind
  before: readonly TypedRow[]
  onTake: (rows: TypedRow[]) => void
  onLeave: () => void
}

/** What a file holds: counts, how it was understood, what is wrong by row, and the lines old and new. */
export function TablePreview({ name, read, kind, before, onTake, onLeave }: TablePreviewProps) {
  const { rows, problems, notes } = read
  const words = columnWords[kind]
  const wrongRows = new Set(problems.map(({ row }) => row)).size
  return (
    <section className="mt-5 pt-3 rule-open" aria-label={`What ${name} holds`}>
      <h4 className="text-body font-semibold">
        {name}{' '}
        <span className="font-normal text-muted">
          {countInWords(rows.length, 'row')} read, not taken yet
          {wrongRows > 0 ? `; ${countInWords(wrongRows, 'row')} to mend` : ''}
        </span>
      </h4>
      {notes.map((note) => (
        <p key={note} className="m-0 text-table text-muted">
          {note}
        </p>
      ))}
      {problems.length > 0 ? (
        <>
          <ProblemRows problems={problems} />
          <p className="mt-3 text-table">Mend the file, then read it again; nothing has been changed.</p>
        </>
      ) : (
        <div className="mt-4 grid gap-x-10 gap-y-6 xl:grid-cols-2">
          <div className="max-h-72 overflow-y-auto">
            <NumbersTable
              numbers={{
                caption: `Rows of ${name}`,
                columns: [{ head: words.at }, { head: words.value }],
                rows: rows.map(({ at, value }) => [at, value]),
              }}
            />
          </div>
          <RecordTablePlot kind={kind} before={before} after={rows} />
        </div>
      )}
      <div className="mt-4 flex flex-wrap items-center gap-4">
        {problems.length === 0 ? (
          <Button size="small" onClick={() => onTake(rows)}>
            {`Take ${rows.length === 1 ? 'this row' : `these ${formatNumber(rows.length)} rows`}`}
          </Button>
        ) : null}
        <LinkLikeButton onClick={onLeave}>Leave it</LinkLikeButton>
      </div>
    </section>
  )
}
