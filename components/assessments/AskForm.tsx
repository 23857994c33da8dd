'use client'

import { useState } from 'react'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SelectField } from '@/components/forms/SelectField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { useActionForm } from '@/components/forms/useActionForm'
import { Button } from '@/components/ui/Button'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import { askQuestionSchema } from '@/lib/domain/assessments/schema'

type Days = '2' | '4' | '7' | '14'
interface Values {
  requestId: number
  question: string
  withinDays: Days
}

export interface AskFormProps {
  requestId: number
  isFirst: boolean
  action: FormAction<Values, { questionId: number }>
}

const days = (['2', '4', '7', '14'] as const).map((value) => ({ value, label: `${value} days` }))

/** Opens to one question, with the time the investigators have. */
export function AskForm({ requestId, isFirst, action }: AskFormProps) {
  const [open, setOpen] = useState(false)
  const form = useActionForm({
    schema: askQuestionSchema,
    action,
    defaultValues: { requestId, question: '', withinDays: '4' },
    onDone: () => showToast('Question sent'),
  })
  if (!open)
    return (
      <Button look="secondary" size="small" onClick={() => setOpen(true)}>
        {isFirst ? 'Ask something' : 'Ask something else'}
      </Button>
    )
  return (
    <ActionForm form={form} label="Question to the investigators">
      <TextAreaField
        name="question"
        label="Question"
        help="It reaches the principal investigator by letter, from the staff of the instrument."
        rows={3}
        limit={1000}
      />
      <SelectField name="withinDays" label="To be answered within" options={days} width="short" />
      <div className="flex flex-wrap items-center gap-4">
        <SubmitButton look="secondary" busyWord="Sending">
          Send the question
        </SubmitButton>
        <LinkLikeButton onClick={() => setOpen(false)}>Leave it</LinkLikeButton>
      </div>
    </ActionForm>
  )
}
