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
  /** Some field still carries its message. */
  hasGaps: boolean
  /** Messages by field; the first one takes the focus. */
  onGaps: (gaps: Record<string, string>) => void
}

const placeOf = (field: string) => (field.startsWith('score-') ? field : `text-${field}`)

/** Finish, open again, go on to the next one. */
export function FinishRow(props: FinishRowProps) {
  const { assignmentId, version, isFinished, shut, mayReopen, nextHref, actions, saveAll, hasGaps, onGaps } =
    props
  const [failure, setFailure] = useState<{ message: string; isOfFields: boolean } | null>(null)
  const [busy, start] = useTransition()

  const send = (act: typeof actions.finish, done: string) =>
    start(async () => {
      try {
        await saveAll()
        const result = await act({ assignmentId, version })
        const gaps = result.ok ? [] : Object.keys(result.fieldErrors)
        setFailure(result.ok ? null : { message: result.message, isOfFields: gaps.length > 0 })
        onGaps(result.ok ? {} : result.fieldErrors)
        if (result.ok) showToast(done)
        else if (gaps[0]) document.getElementById(placeOf(gaps[0]))?.focus()
      } catch {
        setFailure({
          message: 'The observatory did not answer. Nothing you typed is lost; try again.',
          isOfFields: false,
        })
      }
    })

  return (
    <div>
      {failure && (hasGaps || !failure.isOfFields) ? (
        <p role="alert" className="mb-3 text-table font-semibold text-not-feasible">
          {failure.message}
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
