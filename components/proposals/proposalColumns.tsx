import type { TableColumn } from '@/components/tables/tableColumn'
import { Countdown } from '@/components/ui/Countdown'
import { TextLink } from '@/components/ui/TextLink'
import type { ProposalRow } from '@/lib/domain/proposals/tableSchema'
import { ABSENT, formatDay, formatNumber } from '@/lib/format'
import { paths } from '@/lib/paths'
import { stateWords } from './stateWords'

/** A row with the server's now, by which its time left is counted. */
export type ListedRow = ProposalRow & { now: string }

function TimeLeft({ row }: { row: ListedRow }) {
  if (!row.isOpen) return <>{ABSENT}</>
  return (
    <span className="font-semibold text-lamp">
      <Countdown
        untilMs={Date.parse(row.deadline)}
        serverNowMs={Date.parse(row.now)}
        parts={2}
        passed="closed"
      />
    </span>
  )
}

export const proposalColumns: readonly TableColumn<ListedRow>[] = [
  {
    id: 'title',
    head: 'Proposal',
    value: (row) => row.title,
    cell: (row) => (
      <>
        <TextLink strong href={paths.proposal(row.reference)}>
          {row.title || 'Without a title'}
        </TextLink>
        {row.continueIn === null ? null : (
          <span className="mt-1 block leading-6 font-normal">
            <TextLink plain href={paths.proposalContinue(row.reference)}>
              Carry on in call {row.continueIn}
            </TextLink>
          </span>
        )}
      </>
    ),
  },
  { id: 'reference', head: 'Reference', value: (row) => row.reference },
  {
    id: 'state',
    head: 'State',
    value: (row) => stateWords(row),
    cell: (row) => (row.hasAgreed ? stateWords(row) : `${stateWords(row)}, you are asked to agree`),
  },
  {
    id: 'call',
    head: 'Call',
    value: (row) => row.callNumber,
    cell: (row) => `${row.callNumber}, ${row.kindTitle}`,
    csv: (row) => row.callNumber,
  },
  { id: 'lead', head: 'Led by', value: (row) => (row.isLead ? 'you' : row.lead) },
  { id: 'targets', head: 'Targets', align: 'right', value: (row) => row.targets },
  {
    id: 'asked',
    head: 'Asked',
    unit: 'h',
    align: 'right',
    value: (row) => row.askedSeconds / 3600,
    cell: (row) => formatNumber(row.askedSeconds / 3600, 1),
    total: (rows) => formatNumber(rows.reduce((sum, row) => sum + row.askedSeconds, 0) / 3600, 1),
  },
  {
    id: 'left',
    head: 'Time left',
    align: 'right',
    value: (row) => (row.isOpen ? row.deadline : null),
    cell: (row) => <TimeLeft row={row} />,
  },
  {
    id: 'changed',
    head: 'Changed',
    align: 'right',
    value: (row) => row.updatedAt,
    cell: (row) => formatDay(new Date(row.updatedAt)),
  },
]
