'use client'

import { useQueryClient } from '@tanstack/react-query'
import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { BarNote } from '@/components/ui/BarNote'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import type { NightsView } from '@/lib/domain/decisions/nightsView'
import { planSchema } from '@/lib/domain/decisions/schema'
import type { Trial } from '@/lib/domain/decisions/trialSchema'
import { countInWords } from '@/lib/format'
import type { TakePlanAction } from './nightsActions'
import { changesInWords } from './trialWords'

export interface TrialNoteProps {
  view: NightsView
  trial: Trial
  /** False where nothing can be given any more. */
  canTake: boolean
  takePlan: TakePlanAction
  onLeave: () => void
}

/** What a trial would change, and the way to take it or leave it. */
export function TrialNote({ view, trial, canTake, takePlan, onLeave }: TrialNoteProps) {
  const client = useQueryClient()
  const needsReason = [trial.choices, trial.heldHours].some((laid) => Object.keys(laid ?? {}).length > 0)
  const form = useActionForm({
    schema: planSchema,
    action: takePlan,
    defaultValues: { panelId: view.panelId, policy: view.policy, trial, reason: '' },
    onDone: ({ awarded }) => {
      showToast(`${countInWords(awarded, 'proposal is', 'proposals are', true)} given the hours tried`)
      void client.invalidateQueries({ queryKey: ['panel'] })
      onLeave()
    },
  })
  return (
    <BarNote tone="lamp">
      <p className="m-0">
        <strong>Tried, not written.</strong> {changesInWords(view)}
      </p>
      <div className="mt-3 max-w-prose">
        {canTake ? (
          <ActionForm form={form} label="Take what is tried">
            {needsReason ? (
              <TextField
                name="reason"
                label="Why"
                help="Kept with what is laid down, and in the logbook."
                maxLength={500}
              />
            ) : null}
            <div className="flex flex-wrap items-center gap-5 text-table">
              <SubmitButton look="secondary" busyWord="Taking over">
                Take over as tried
              </SubmitButton>
              <LinkLikeButton onClick={onLeave}>Back to what stands</LinkLikeButton>
            </div>
          </ActionForm>
        ) : (
          <LinkLikeButton onClick={onLeave}>Back to what stands</LinkLikeButton>
        )}
      </div>
    </BarNote>
  )
}
