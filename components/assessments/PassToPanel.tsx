'use client'

import { useRouter } from 'next/navigation'
import { useState, useTransition } from 'react'
import { Button } from '@/components/ui/Button'
import { showToast } from '@/components/ui/showToast'
import type { ActionResult } from '@/lib/actions/result'
import { countInWords } from '@/lib/format'
import type { RequestGroup } from './requestGroups'

export interface PassToPanelProps {
  group: RequestGroup
  action: (input: { instrumentId: number; callNumber: number }) => Promise<ActionResult<{ passed: number }>>
}

/** Hands all assessments of one instrument to the panel. */
export function PassToPanel({ group, action }: PassToPanelProps) {
  const { callNumber, instrumentId, instrument, count, open, toPass, isSettled } = group
  const [failure, setFailure] = useState<string | null>(null)
  const [busy, start] = useTransition()
  const router = useRouter()
  if (isSettled)
    return (
      <p className="m-0 text-table text-muted">
        Call {callNumber}, {instrument}: settled, the panel has begun to rank.
      </p>
    )
  if (toPass === 0)
    return (
      <p className="m-0 text-table text-muted">
        Call {callNumber}, {instrument}: {countInWords(count, 'request')} passed to the panel. Later changes
        reach it at once.
      </p>
    )
  const pass = () =>
    start(async () => {
      const result = await action({ instrumentId, callNumber })
      setFailure(result.ok ? null : result.message)
      if (!result.ok) return
      showToast('Passed to the panel')
      router.refresh()
    })
  return (
    <div className="flex flex-wrap items-center gap-4">
      <span className="text-table">
        Call {callNumber}, {instrument}
      </span>
      <Button
        look="secondary"
        size="small"
        busy={busy}
        busyWord="Passing"
        onClick={pass}
        offReason={open > 0 ? `${countInWords(open, 'is', 'are', true)} open` : null}
      >
        Pass all {count} to the panel
      </Button>
      {failure ? (
        <span role="alert" className="text-table font-semibold text-not-feasible">
          {failure}
        </span>
      ) : null}
    </div>
  )
}
