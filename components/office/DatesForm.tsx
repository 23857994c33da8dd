'use client'

import { useRouter } from 'next/navigation'
import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { useActionForm } from '@/components/forms/useActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { showToast } from '@/components/ui/showToast'
import { saveDatesSchema } from '@/lib/domain/calls/schema'
import type { Call } from '@/lib/domain/calls/types'
import { CallDateFields } from './CallDateFields'
import { useFollowedVersion } from './useFollowedVersion'

type Input = z.input<typeof saveDatesSchema>

interface DatesFormProps {
  call: Call
  utcOffsetHours: number
  action: FormAction<Input, unknown>
}

// Whole seconds: the date field shows no finer, and a deadline set by closing keeps its milliseconds in the database.
const typed = (at: Date) => at.toISOString()

/** The dates of a call; a deadline that has passed cannot be moved. */
export function DatesForm({ call, utcOffsetHours, action }: DatesFormProps) {
  const router = useRouter()
  const form = useActionForm({
    schema: saveDatesSchema,
    action,
    defaultValues: {
      slug: call.slug,
      version: call.version,
      opensAt: typed(call.opensAt),
      closesAt: typed(call.closesAt),
      graceUntil: typed(call.graceUntil),
      assessmentsDueAt: typed(call.assessmentsDueAt),
      reviewsDueAt: typed(call.reviewsDueAt),
      panelMeetsAt: typed(call.panelMeetsAt),
      lettersAt: typed(call.lettersAt),
    },
    onDone: () => {
      form.form.setValue('version', form.form.getValues('version') + 1)
      showToast('Dates saved')
      router.refresh()
    },
  })
  useFollowedVersion(call.version, {
    getValues: (name) => form.form.getValues(name),
    setValue: (name, value) => form.form.setValue(name, value),
  })
  return (
    <ActionForm form={form}>
      <CallDateFields utcOffsetHours={utcOffsetHours} />
      <div>
        <SubmitButton look="secondary" busyWord="Saving">
          Save the dates
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
