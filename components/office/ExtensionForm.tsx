'use client'

import { useRouter } from 'next/navigation'
import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { DateTimeField } from '@/components/forms/DateTimeField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { useActionForm } from '@/components/forms/useActionForm'
import { showToast } from '@/components/ui/showToast'
import { extendProposalSchema } from '@/lib/domain/calls/extensionSchema'

interface ExtensionFormProps {
  reference: string
  /** The deadline that holds for it now. */
  closesAt: Date
  utcOffsetHours: number
  action: FormAction<z.input<typeof extendProposalSchema>, unknown>
}

/** A later deadline for one proposal, with the reason. */
export function ExtensionForm({ reference, closesAt, utcOffsetHours, action }: ExtensionFormProps) {
  const router = useRouter()
  const form = useActionForm({
    schema: extendProposalSchema,
    action,
    defaultValues: { reference, closesAt: closesAt.toISOString(), why: '' },
    onDone: () => {
      form.form.setValue('why', '')
      showToast(`${reference} has a deadline of its own`)
      router.refresh()
    },
  })
  return (
    <ActionForm form={form} label="A deadline of its own">
      <DateTimeField name="closesAt" label="It may be sent until" utcOffsetHours={utcOffsetHours} />
      <TextAreaField
        name="why"
        label="Why"
        help="Stands in the logbook and in the letter."
        rows={2}
        limit={500}
      />
      <div>
        <SubmitButton look="secondary" busyWord="Saving">
          Give it this deadline
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
