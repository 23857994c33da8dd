'use client'

import { useQuery } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { useTransition } from 'react'
import { fetchJson } from '@/components/tables/fetchJson'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { Button } from '@/components/ui/Button'
import { ProgressBar } from '@/components/ui/ProgressBar'
import { TextLink } from '@/components/ui/TextLink'
import { showToast } from '@/components/ui/showToast'
import { bulkProgressReply, type BulkProgress } from '@/lib/domain/bulkLetters/schema'
import { countInWords } from '@/lib/format'
import { paths } from '@/lib/paths'

interface BulkProgressPanelProps {
  id: number
  initial: BulkProgress
  stop: FormAction<{ id: number }, { stopped: number }>
}

const everyMs = 3000

function words({ total, sent, waiting, refused, stopped }: BulkProgress): string {
  const parts = [
    `${sent} of ${total} sent`,
    waiting > 0 && `${waiting} waiting`,
    refused > 0 && `${refused} refused`,
    stopped > 0 && `${stopped} stopped`,
  ]
  return parts.filter(Boolean).join(', ')
}

/** How far a letter to many has got, looked up again while anything waits; what waits can be stopped. */
export function BulkProgressPanel({ id, initial, stop }: BulkProgressPanelProps) {
  const router = useRouter()
  const [busy, start] = useTransition()
  const query = useQuery({
    queryKey: ['office-bulk-letter', id],
    queryFn: ({ signal }) =>
      fetchJson(`${paths.api.table('office-bulk-letter')}?id=${id}`, bulkProgressReply, signal),
    initialData: initial,
    refetchInterval: ({ state }) => ((state.data?.waiting ?? 0) > 0 ? everyMs : false),
  })
  const at = query.data
  const run = () =>
    start(async () => {
      const answer = await stop({ id })
      showToast(
        answer.ok
          ? `${countInWords(answer.data.stopped, 'letter', 'letters', true)} stopped`
          : answer.message,
      )
      await query.refetch()
      router.refresh()
    })
  return (
    <section aria-label="How far it has got" className="max-w-prose">
      <ProgressBar share={at.total === 0 ? 1 : (at.total - at.waiting) / at.total} label="Letters sent" />
      <div className="mt-3 flex flex-wrap items-center gap-x-6 gap-y-3">
        <p className="m-0 font-semibold" role="status">
          {words(at)}
        </p>
        {at.waiting + at.refused > 0 ? (
          <Button look="secondary" size="small" busy={busy} busyWord="Stopping" onClick={run}>
            Stop what has not been sent
          </Button>
        ) : null}
        <span className="text-table">
          <TextLink href={paths.office('mail')}>See each in the outbox</TextLink>
        </span>
      </div>
    </section>
  )
}
