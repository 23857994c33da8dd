'use client'

import { useQueryClient } from '@tanstack/react-query'
import { createContext, useContext } from 'react'
import { DataTable } from '@/components/tables/DataTable'
import type { TableColumn } from '@/components/tables/tableColumn'
import { useTableQuery } from '@/components/tables/useTableQuery'
import { EmptyState } from '@/components/ui/EmptyState'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { TextLink } from '@/components/ui/TextLink'
import { showToast } from '@/components/ui/showToast'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { lettersReply, type LetterRow, type LettersReply } from '@/lib/domain/outbox/schema'
import { mayBeTriedNow } from '@/lib/domain/outbox/rules'
import { ABSENT, formatUtcInstant } from '@/lib/format'
import { paths } from '@/lib/paths'
import { letterStands } from './letterStands'

const Retry = createContext<((letter: LetterRow) => void) | null>(null)
const key = ['office-letters'] as const

function RetryButton({ letter }: { letter: LetterRow }) {
  const retry = useContext(Retry)
  if (!mayBeTriedNow(letter)) return null
  return (
    <LinkLikeButton onClick={() => retry?.(letter)} aria-label={`Send the letter to ${letter.toName} now`}>
      Send now
    </LinkLikeButton>
  )
}

const columns: TableColumn<LetterRow>[] = [
  {
    id: 'subject',
    head: 'Letter',
    value: (row) => row.subject,
    cell: (row) => <TextLink href={paths.officeLetter(row.id)}>{row.subject}</TextLink>,
  },
  { id: 'to', head: 'To', value: (row) => row.toName || row.toEmail },
  { id: 'email', head: 'Address', value: (row) => row.toEmail },
  {
    id: 'written',
    head: 'Written',
    value: (row) => row.createdAt,
    cell: (row) => formatUtcInstant(new Date(row.createdAt)),
  },
  { id: 'state', head: 'Stands', value: (row) => letterStands[row.state] },
  { id: 'tries', head: 'Tries', align: 'right', value: (row) => row.attempts },
  {
    id: 'error',
    head: 'The mail server said',
    wide: true,
    value: (row) => row.lastError,
    cell: (row) => row.lastError ?? ABSENT,
  },
  { id: 'deed', head: '', value: () => '', sortable: false, cell: (row) => <RetryButton letter={row} /> },
]

/** The outbox: what waits, what was sent, what was set aside. */
export function LettersTable({
  initial,
  retry,
}: {
  initial: LettersReply
  retry: FormAction<{ letterId: number }, unknown>
}) {
  const client = useQueryClient()
  const { data = initial } = useTableQuery({
    key,
    url: paths.api.table('office-letters'),
    schema: lettersReply,
    initialData: initial,
  })
  const send = async (letter: LetterRow) => {
    const answer = await retry({ letterId: letter.id })
    showToast(answer.ok ? 'It goes out within seconds' : answer.message)
    await client.invalidateQueries({ queryKey: key })
  }
  return (
    <Retry.Provider value={(letter) => void send(letter)}>
      <DataTable
        caption="Letters"
        columns={columns}
        rows={data.rows}
        rowId={(row) => String(row.id)}
        find="Subject, name or address"
        chips={[
          { id: 'waiting', label: 'Waiting', matches: (row) => row.state === 'queued' },
          { id: 'aside', label: 'Set aside', matches: (row) => row.state === 'parked' },
          { id: 'refused', label: 'Address refused', matches: (row) => row.state === 'bounced' },
          { id: 'sent', label: 'Sent', matches: (row) => row.state === 'sent' },
        ]}
        csv="letters"
        page={50}
        tone={(row) => (row.state === 'parked' || row.state === 'bounced' ? 'not-feasible' : null)}
        empty={
          <EmptyState title="No letter yet">Letters appear here as soon as they are written.</EmptyState>
        }
      />
    </Retry.Provider>
  )
}
