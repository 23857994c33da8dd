'use client'

import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { NumberField } from '@/components/forms/NumberField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { CallChoice } from '@/components/office/CallChoice'
import { useCallForm } from '@/components/office/useCallForm'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { savePanelSchema } from '@/lib/domain/calls/rulesSchema'
import type { CallPanel } from '@/lib/domain/calls/types'

export type PanelInput = z.input<typeof savePanelSchema>

interface PanelFormProps {
  call: { slug: string; version: number }
  /** Null for a new panel. */
  panel: CallPanel | null
  action: FormAction<PanelInput, unknown>
  onClose: () => void
}

/** One panel, to be changed or added. */
export function PanelForm({ call, panel, action, onClose }: PanelFormProps) {
  const form = useCallForm({
    schema: savePanelSchema,
    action,
    defaultValues: {
      ...call,
      panelId: panel?.id ?? null,
      name: panel?.name ?? '',
      quorum: String(panel?.quorum ?? 3),
    },
    done: panel ? `${panel.name} is saved` : 'The panel is added',
    compared: { name: 'Name', quorum: 'Quorum' },
    onDone: onClose,
  })
  return (
    <ActionForm form={form} label={panel ? panel.name : 'A new panel'}>
      <CallChoice comparison={form.comparison} />
      <div className="grid gap-x-8 gap-y-6 sm:grid-cols-2">
        <TextField name="name" label="Name" />
        <NumberField name="quorum" label="Quorum" whole help="Members needed to decide." />
      </div>
      <div className="flex flex-wrap items-center gap-5">
        <SubmitButton look="secondary" busyWord="Saving">
          {panel ? 'Save this panel' : 'Add this panel'}
        </SubmitButton>
        <LinkLikeButton onClick={onClose}>Leave it</LinkLikeButton>
      </div>
    </ActionForm>
  )
}
