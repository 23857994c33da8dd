'use client'

import { useQueryClient } from '@tanstack/react-query'
import { ActionForm } from '@/components/forms/ActionForm'
import { NumberField } from '@/components/forms/NumberField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import type { NightsView } from '@/lib/domain/decisions/nightsView'
import { heldSchema } from '@/lib/domain/decisions/schema'
import type { HoldHoursAction } from './nightsActions'

export interface HeldFormProps {
  telescope: NightsView['telescopes'][number]
  panelId: number
  hold: HoldHoursAction
  onLeave: () => void
}

/** Holds hours of one telescope back. */
export function HeldForm({ telescope, panelId, hold, onLeave }: HeldFormProps) {
  const client = useQueryClient()
  const { id, name, heldSeconds, heldReason } = telescope
  const form = useActionForm({
    schema: heldSchema,
    action: hold,
    defaultValues: {
      panelId,
      telescopeId: id,
      hours: heldSeconds > 0 ? String(Math.round((heldSeconds / 3600) * 1000) / 1000) : '',
      reason: heldReason,
    },
    onDone: () => {
      showToast(`The hours held back on ${name} are kept`)
      void client.invalidateQueries({ queryKey: ['panel'] })
      onLeave()
    },
  })
  return (
    <div className="mt-3 border-l-4 border-accent bg-wash p-4">
      <ActionForm form={form} label={`Hours held back on ${name}`}>
        <div className="flex flex-wrap items-end gap-x-6 gap-y-4">
          <NumberField name="hours" label="Held back" unit="h" />
          <div className="min-w-60 grow">
            <TextField name="reason" label="What for" maxLength={500} />
          </div>
        </div>
        <div className="flex flex-wrap items-center gap-5 text-table">
          <SubmitButton look="secondary" busyWord="Keeping">
            Hold them back
          </SubmitButton>
          <LinkLikeButton onClick={onLeave}>Leave it</LinkLikeButton>
        </div>
      </ActionForm>
    </div>
  )
}
