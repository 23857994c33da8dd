'use client'

import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { TextField } from '@/components/forms/TextField'
import { correctCallSchema } from '@/lib/domain/calls/correctionSchema'
import { useCallForm } from './useCallForm'

interface CorrectionFormProps {
  call: { slug: string; version: number }
  action: FormAction<z.input<typeof correctCallSchema>, unknown>
}

/** A dated correction of a published call. */
export function CorrectionForm({ call, action }: CorrectionFormProps) {
  const form = useCallForm({
    schema: correctCallSchema,
    action,
    defaultValues: { ...call, concerns: '', body: '' },
    done: 'The correction is published',
    cleared: { concerns: '', body: '' },
  })
  return (
    <ActionForm form={form} label="A correction">
      <TextField
        name="concerns"
        label="What it concerns"
        help="In a few words: the pages of large programmes."
      />
      <TextAreaField name="body" label="What holds" rows={4} limit={2000} />
      <div>
        <SubmitButton look="secondary" busyWord="Publishing">
          Publish this correction
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
