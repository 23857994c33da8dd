'use client'

import { useRouter } from 'next/navigation'
import { ConfirmTyped } from '@/components/ui/ConfirmTyped'
import { LinkButton } from '@/components/ui/LinkButton'
import { showToast } from '@/components/ui/showToast'
import type { FormAction } from '@/components/forms/actionFormTypes'
import type { Call, CallPhase } from '@/lib/domain/calls/types'
import { paths } from '@/lib/paths'
import { noteOwnSave } from './ownSaves'

type Step = FormAction<{ slug: string; version: number }, unknown>

interface CallStepsProps {
  call: Call
  phase: CallPhase
  open: Step
  close: Step
}

/** What the office can do with a call as it stands: open it, close it, or follow its panel. */
export function CallSteps({ call, phase, open, close }: CallStepsProps) {
  const router = useRouter()
  const take = async (step: Step, done: string): Promise<string | null> => {
    const answer = await step({ slug: call.slug, version: call.version })
    if (!answer.ok) return Object.values(answer.fieldErrors)[0] ?? answer.message
    noteOwnSave(call.slug, call.version + 1)
    showToast(done)
    router.refresh()
    return null
  }
  return (
    <>
      {phase === 'planned' ? null : (
        <LinkButton look="secondary" href={paths.call(call.slug)}>
          As everyone sees it
        </LinkButton>
      )}
      {phase === 'planned' ? (
        <ConfirmTyped
          trigger="Open this call"
          triggerProps={{ look: 'secondary', size: 'regular' }}
          title={`Open ${call.title}?`}
          expected={String(call.number)}
          expectedName="the number of the call"
          confirm="Open it now"
          busyWord="Opening"
          onConfirm={() => take(open, `${call.title} is open`)}
        >
          Everyone can read it from now on, and send proposals until its deadline.
        </ConfirmTyped>
      ) : null}
      {phase === 'open' ? (
        <ConfirmTyped
          trigger="Close this call"
          triggerProps={{ look: 'secondary', size: 'regular' }}
          title={`Close ${call.title} now?`}
          expected={String(call.number)}
          expectedName="the number of the call"
          confirm="Close it now"
          busyWord="Closing"
          onConfirm={() => take(close, `${call.title} is closed`)}
        >
          What has arrived by the second you press counts. Drafts that were not sent stay drafts.
        </ConfirmTyped>
      ) : null}
    </>
  )
}
