'use client'

import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { RadioField, type RadioOption } from '@/components/forms/RadioField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { useActionForm } from '@/components/forms/useActionForm'
import { continueSchema } from '@/lib/domain/continuation/schema'

export interface ContinueFormProps {
  reference: string
  action: FormAction<z.input<typeof continueSchema>, { reference: string }>
  kinds: readonly RadioOption[]
  /** The kind it was, where the call has it; else ''. */
  chosen: string
}

/** Which kind an earlier proposal is to be in the new call, and the button that carries it on. */
export function ContinueForm({ reference, action, kinds, chosen }: ContinueFormProps) {
  const form = useActionForm({
    schema: continueSchema,
    action,
    defaultValues: { reference, kindId: chosen },
  })
  return (
    <ActionForm form={form} label="Carry it on">
      <RadioField name="kindId" label="What kind of proposal is it to be?" options={kinds} />
      <div>
        <SubmitButton busyWord="Carrying it on">Carry it on</SubmitButton>
      </div>
    </ActionForm>
  )
}
