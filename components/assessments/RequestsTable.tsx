'use client'

import { DataTable } from '@/components/tables/DataTable'
import type { TableChip, TableColumn } from '@/components/tables/tableColumn'
import { useTableQuery } from '@/components/tables/useTableQuery'
import { TextLink } from '@/components/ui/TextLink'
import { VerdictMark } from '@/components/ui/VerdictMark'
import { requestLinesReply } from '@/lib/domain/assessments/requestLinesSchema'
import type { RequestLine } from '@/lib/domain/assessments/types'
import { ABSENT, countInWords, formatNumber } from '@/lib/format'
import { paths } from '@/lib/paths'
import { AssessedCell } from './AssessedCell'

type HoursKey = 'askedSeconds' | 'computedSeconds' | 'trueSeconds'

const sum = (rows: readonly RequestLine[], key: HoursKey) =>
  formatNumber(rows.reduce((total, row) => total + (row[key] ?? 0), 0) / 3600, 1)

const hours = (id: string, head: string, key: HoursKey): TableColumn<RequestLine> => ({
  id,
  head,
  unit: 'h',
  align: 'right',
  computed: key === 'computedSeconds',
  value: (line) => (line[key] === null ? null : line[key] / 3600),
  cell: (line) => {
    const value = formatNumber(line[key] === null ? null : line[key] / 3600, 1)
    return key === 'trueSeconds' ? <strong className="font-semibold">{value}</strong> : value
  },
  total: (rows) => sum(rows, key),
})

const columns: readonly TableColumn<RequestLine>[] = [
  {
    id: 'request',
    head: 'Request',
    value: (line) => line.reviewNumber,
    cell: (line) => (
      <TextLink href={paths.assessment(line.requestId)} strong>
        {line.reviewNumber}
      </TextLink>
    ),
    total: () => 'In all',
  },
  {
    id: 'title',
    head: 'Title',
    value: (line) => line.title,
    total: (rows) => countInWords(rows.length, 'request', 'requests'),
  },
  {
    id: 'targets',
    head: 'Targets, mode',
    value: (line) => `${line.targets}, ${line.modes}`,
  },
  hours('asked', 'Asked', 'askedSeconds'),
  hours('computed', 'Computed', 'computedSeconds'),
  hours('true', 'True', 'trueSeconds'),
  {
    id: 'verdict',
    head: 'Computed verdict',
    value: (line) => line.verdict,
    cell: (line) => (line.verdict ? <VerdictMark verdict={line.verdict} /> : ABSENT),
  },
  {
    id: 'assessed',
    head: 'Assessed',
    value: (line) => line.assessed ?? 'open',
    cell: (line) => <AssessedCell line={line} />,
    total: (rows) => {
      const open = rows.filter((row) => row.assessed === null).length
      return `${rows.length - open} assessed, ${open} open`
    },
  },
]

const chips: readonly TableChip<RequestLine>[] = [
  { id: 'open', label: 'Open', matches: (line) => line.assessed === null },
  { id: 'asked', label: 'Question asked', matches: (line) => line.question === 'asked' },
  { id: 'answered', label: 'Answer came', matches: (line) => line.question === 'answered' },
]

/** Requests on the scientist's instruments; every number is of that instrument alone. */
export function RequestsTable({ initial }: { initial: { lines: RequestLine[] } }) {
  const { data } = useTableQuery({
    key: ['assessments', initial],
    url: paths.api.table('assessments'),
    schema: requestLinesReply,
    initialData: initial,
  })
  return (
    <DataTable
      caption="Requests on your instruments"
      columns={columns}
      rows={data?.lines ?? initial.lines}
      rowId={(line) => String(line.requestId)}
      find="Number, title or mode"
      chips={chips}
      csv="requests"
    />
  )
}
