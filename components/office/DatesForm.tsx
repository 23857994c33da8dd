'use client'

import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { saveDatesSchema } from '@/lib/domain/calls/schema'
import type { Call } from '@/lib/domain/calls/types'
import { formatUtcInstant } from '@/lib/format'
import { CallChoice } from './CallChoice'
import { callDateFields, CallDateFields } from './CallDateFields'
import { useCallForm } from './useCallForm'

type Input = z.input<typeof saveDatesSchema>

interface DatesFormProps {
  call: Call
  utcOffsetHours: number
  /** Whether a moved deadline is told to those with drafts, and so wants a reason. */
  isOpen: boolean
  action: FormAction<Input, unknown>
}

// Whole seconds: the date field shows no finer, and a deadline set by closing keeps its milliseconds in the database.
const typed = (at: Date) => at.toISOString()
const compared = Object.fromEntries(callDateFields)
const said = (_: string, value: unknown) =>
  Number.isNaN(Date.parse(String(value)))
    ? String(value) || 'none'
    : formatUtcInstant(new Date(String(value)))

/** The dates of a call; a deadline that has passed cannot be moved. */
export function DatesForm({ call, utcOffsetHours, isOpen, action }: DatesFormProps) {
  const form = useCallForm({
    schema: saveDatesSchema,
    action,
    defaultValues: {
      slug: call.slug,
      version: call.version,
      why: '',
      opensAt: typed(call.opensAt),
      closesAt: typed(call.closesAt),
      graceUntil: typed(call.graceUntil),
      assessmentsDueAt: typed(call.assessmentsDueAt),
      reviewsDueAt: typed(call.reviewsDueAt),
      panelMeetsAt: typed(call.panelMeetsAt),
      lettersAt: typed(call.lettersAt),
    },
    done: 'Dates saved',
    compared,
    cleared: { why: '' },
  })
  return (
    <ActionForm form={form}>
      <CallChoice comparison={form.comparison} say={said} />
      <CallDateFields utcOffsetHours={utcOffsetHours} />
      {isOpen ? (
        <TextAreaField
          name="why"
          label="Why the deadline moves"
          help="Only where it does. Everyone with a draft gets one letter, with this in it."
          optional
          rows={2}
          limit={500}
        />
      ) : null}
      <div>
        <SubmitButton look="secondary" busyWord="Saving">
          Save the dates
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
