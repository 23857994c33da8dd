'use client'

import { useEffect } from 'react'
import { useWatch } from 'react-hook-form'
import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { SelectField } from '@/components/forms/SelectField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import type { MovedDates } from '@/lib/domain/calls/movedDates'
import { planCallSchema } from '@/lib/domain/calls/schema'
import { CallDateFields } from './CallDateFields'

type Input = z.input<typeof planCallSchema>

interface PlanCallFormProps {
  action: FormAction<Input, { slug: string }>
  /** Calls to take after, each with its season and dates moved to the season that follows. */
  patterns: { value: string; label: string; dates: MovedDates }[]
  utcOffsetHours: number
}

/** Season, dates, and the call whose rules are taken over; its dates stand there, moved, until one types others. */
export function PlanCallForm({ action, patterns, utcOffsetHours }: PlanCallFormProps) {
  const [first] = patterns
  const handle = useActionForm({
    schema: planCallSchema,
    action,
    defaultValues: { from: first?.value ?? '', ...first?.dates },
  })
  const { control, setValue, formState } = handle.form
  const { dirtyFields } = formState
  const from = useWatch({ control, name: 'from' })
  useEffect(() => {
    const dates = patterns.find(({ value }) => value === from)?.dates
    for (const [name, value] of Object.entries(dates ?? {}) as [keyof MovedDates, string][])
      if (!dirtyFields[name]) setValue(name, value)
    // Only when another call is chosen: what was typed stays.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [from])
  return (
    <ActionForm form={handle} label="Plan the next call">
      <SelectField
        name="from"
        label="After the pattern of"
        help="Its dates stand below, moved by whole weeks to the season that follows."
        options={patterns}
        width="medium"
      />
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
      <CallDateFields utcOffsetHours={utcOffsetHours} />
      <div>
        <SubmitButton look="secondary" busyWord="Planning">
          Plan this call
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
