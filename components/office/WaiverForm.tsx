'use client'

import { useQueryClient } from '@tanstack/react-query'
import { ActionForm } from '@/components/forms/ActionForm'
import { RadioField } from '@/components/forms/RadioField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { showToast } from '@/components/ui/showToast'
import { decideWaiverSchema, type DecideWaiverInput } from '@/lib/domain/fees/schema'

interface WaiverFormProps {
  waiverId: number
  reason: string
  slug: string
  action: FormAction<DecideWaiverInput, unknown>
}

const choices = [
  { value: 'granted', label: 'Grant it', help: 'nothing is owed any more' },
  { value: 'refused', label: 'Refuse it', help: 'the fee stays owed' },
]

/** The reason a waiver is asked for, and the office's answer. */
export function WaiverForm({ waiverId, reason, slug, action }: WaiverFormProps) {
  const client = useQueryClient()
  const form = useActionForm({
    schema: decideWaiverSchema,
    action,
    defaultValues: { waiverId, note: '' },
    onDone: () => {
      showToast('Decided; the investigators are told')
      void client.invalidateQueries({ queryKey: ['office-proposals', slug] })
    },
  })
  return (
    <div className="grid gap-6 py-2 md:grid-cols-2">
      <blockquote className="m-0 max-w-prose">“{reason}”</blockquote>
      <ActionForm form={form}>
        <RadioField name="decision" label="Your answer" options={choices} />
        <TextField name="note" label="Note to the investigators" help="Wanted where you refuse." optional />
        <div>
          <SubmitButton look="secondary" size="small" busyWord="Deciding">
            Decide
          </SubmitButton>
        </div>
      </ActionForm>
    </div>
  )
}
