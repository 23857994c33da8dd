'use client'

import { useState, useTransition } from 'react'
import { Button } from '@/components/ui/Button'
import { LinkButton } from '@/components/ui/LinkButton'
import { showToast } from '@/components/ui/showToast'
import type { SheetProps } from './sheetTypes'

export interface FinishRowProps extends Pick<
  SheetProps,
  'assignmentId' | 'version' | 'isFinished' | 'shut' | 'mayReopen' | 'nextHref' | 'actions'
> {
  saveAll: () => Promise<void>
  /** Messages by field; the first one takes the focus. */
  onGaps: (gaps: Record<string, string>) => void
}

const placeOf = (field: string) => (field.startsWith('score-') ? field : `text-${field}`)

/** Finish, open again, go on to the next one. */
export function FinishRow(props: FinishRowProps) {
  const { assignmentId, version, isFinished, shut, mayReopen, nextHref, actions, saveAll, onGaps } = props
  const [failure, setFailure] = useState<string | null>(null)
  const [busy, start] = useTransition()

  const send = (act: typeof actions.finish, done: string) =>
    start(async () => {
      try {
        await saveAll()
        const result = await act({ assignmentId, version })
        setFailure(result.ok ? null : result.message)
        onGaps(result.ok ? {} : result.fieldErrors)
        if (result.ok) showToast(done)
        else {
          const first = Object.keys(result.fieldErrors)[0]
          if (first) document.getElementById(placeOf(first))?.focus()
        }
      } catch {
        setFailure('The observatory did not answer. Nothing you typed is lost; try again.')
      }
    })

  return (
    <div>
      {failure ? (
        <p role="alert" className="mb-3 text-table font-semibold text-not-feasible">
          {failure}
        </p>
      ) : null}
      {shut ? <p className="mb-3 text-table text-muted">{shut}</p> : null}
      <div className="flex flex-wrap gap-3">
        {shut ? null : (
          <Button busy={busy} busyWord="Finishing" onClick={() => send(actions.finish, 'Review finished')}>
            Finish this review
          </Button>
        )}
        {isFinished && mayReopen ? (
          <Button
            look="secondary"
            busy={busy}
            busyWord="Opening"
            onClick={() => send(actions.reopen, 'Review open again')}
          >
            Open it again
          </Button>
        ) : null}
        {nextHref ? (
          <LinkButton href={nextHref} look={shut ? 'primary' : 'secondary'}>
            Next to read
          </LinkButton>
        ) : null}
      </div>
    </div>
  )
}
