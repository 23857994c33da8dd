'use client'

import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { RadioField, type RadioOption } from '@/components/forms/RadioField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { beginSchema } from '@/lib/domain/proposals/schema'

export interface BeginFormProps {
  action: FormAction<z.input<typeof beginSchema>, { reference: string }>
  kinds: readonly RadioOption[]
}

/** A new proposal: what kind, and what it is called. Everything else comes on its own pages. */
export function BeginForm({ action, kinds }: BeginFormProps) {
  const only = kinds.length === 1 ? kinds[0]?.value : undefined
  const form = useActionForm({
    schema: beginSchema,
    action,
    defaultValues: { kindId: only ?? '', title: '' },
  })
  return (
    <ActionForm form={form} label="A new proposal">
      <RadioField name="kindId" label="What kind of proposal is it?" options={kinds} />
      <TextField
        name="title"
        label="What is it called?"
        help="Reviewers read it first. It can be changed until you send."
        spellCheck
      />
      <div>
        <SubmitButton busyWord="Beginning">Begin the proposal</SubmitButton>
      </div>
    </ActionForm>
  )
}
