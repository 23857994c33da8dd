'use client'

import { DataTable } from '@/components/tables/DataTable'
import type { TableChip, TableColumn } from '@/components/tables/tableColumn'
import { useTableQuery } from '@/components/tables/useTableQuery'
import { TextLink } from '@/components/ui/TextLink'
import { VerdictMark } from '@/components/ui/VerdictMark'
import { reviewLinesReply } from '@/lib/domain/reviews/reviewLinesSchema'
import type { ReviewLine } from '@/lib/domain/reviews/types'
import { formatDay, formatNumber } from '@/lib/format'
import { paths } from '@/lib/paths'
import { reviewWords } from './reviewWords'

const columns: readonly TableColumn<ReviewLine>[] = [
  {
    id: 'number',
    head: 'Review',
    value: (line) => line.reviewNumber,
    cell: (line) => (
      <TextLink href={paths.review(line.assignmentId)} strong>
        {line.reviewNumber}
      </TextLink>
    ),
  },
  { id: 'title', head: 'Title', value: (line) => line.title },
  {
    id: 'asked',
    head: 'Asked',
    unit: 'h',
    align: 'right',
    value: (line) => line.askedSeconds / 3600,
    cell: (line) => formatNumber(line.askedSeconds / 3600, 1),
  },
  { id: 'instrument', head: 'Instrument', value: (line) => line.instruments },
  {
    id: 'verdict',
    head: 'Computed',
    value: (line) => line.verdict,
    cell: (line) => (line.verdict ? <VerdictMark verdict={line.verdict} /> : '–'),
  },
  {
    id: 'score',
    head: 'My score',
    align: 'right',
    value: (line) => line.score,
    cell: (line) => <strong className="font-semibold">{formatNumber(line.score, 1)}</strong>,
  },
  {
    id: 'state',
    head: 'State',
    value: (line) => reviewWords[line.state],
    cell: (line) => (
      <span className={line.state === 'finished' ? undefined : 'font-semibold text-accent'}>
        {reviewWords[line.state]}
      </span>
    ),
  },
  {
    id: 'due',
    head: 'Due',
    value: (line) => line.dueAt,
    cell: (line) => formatDay(new Date(line.dueAt)),
  },
]

const chips: readonly TableChip<ReviewLine>[] = [
  { id: 'to-read', label: 'To read', matches: (line) => line.state === 'to-read' },
  { id: 'begun', label: 'Begun', matches: (line) => line.state === 'begun' },
  { id: 'finished', label: 'Finished', matches: (line) => line.state === 'finished' },
]

/** The reviewer's own assignments. */
export function ReviewsTable({ initial }: { initial: { lines: ReviewLine[] } }) {
  const { data } = useTableQuery({
    key: ['reviews', initial],
    url: paths.api.table('reviews'),
    schema: reviewLinesReply,
    initialData: initial,
  })
  return (
    <DataTable
      caption="Your reviews"
      columns={columns}
      rows={data?.lines ?? initial.lines}
      rowId={(line) => String(line.assignmentId)}
      find="Number, title or instrument"
      chips={chips}
      csv="my-reviews"
    />
  )
}
