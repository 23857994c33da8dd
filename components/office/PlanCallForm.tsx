'use client'

import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { SelectField } from '@/components/forms/SelectField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { planCallSchema } from '@/lib/domain/calls/schema'
import { CallDateFields } from './CallDateFields'

type Input = z.input<typeof planCallSchema>

interface PlanCallFormProps {
  action: FormAction<Input, { slug: string }>
  patterns: { value: string; label: string }[]
}

const empty = {
  opensAt: '',
  closesAt: '',
  graceUntil: '',
  assessmentsDueAt: '',
  reviewsDueAt: '',
  panelMeetsAt: '',
  lettersAt: '',
}

/** Season, dates, and the call whose rules are taken over. */
export function PlanCallForm({ action, patterns }: PlanCallFormProps) {
  const form = useActionForm({
    schema: planCallSchema,
    action,
    defaultValues: { from: patterns[0]?.value ?? '', seasonFrom: '', seasonTo: '', ...empty },
  })
  return (
    <ActionForm form={form}>
      <SelectField name="from" label="After the pattern of" options={patterns} width="medium" />
      <div className="grid gap-x-8 gap-y-6 sm:grid-cols-2">
        <TextField
          name="seasonFrom"
          label="First evening"
          help="Year-month-day"
          width="medium"
          inputMode="numeric"
        />
        <TextField
          name="seasonTo"
          label="Last evening"
          help="Year-month-day"
          width="medium"
          inputMode="numeric"
        />
      </div>
      <CallDateFields />
      <div>
        <SubmitButton look="secondary" busyWord="Planning">
          Plan this call
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
