'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { useActionForm } from '@/components/forms/useActionForm'
import { showToast } from '@/components/ui/showToast'
import { answerQuestionSchema } from '@/lib/domain/assessments/schema'

interface Values {
  reference: string
  questionId: number
  answer: string
}

export interface AnswerFormProps {
  reference: string
  questionId: number
  action: FormAction<Values, { questionId: number }>
}

/** The investigators' answer; it is sent once. */
export function AnswerForm({ reference, questionId, action }: AnswerFormProps) {
  const form = useActionForm({
    schema: answerQuestionSchema,
    action,
    defaultValues: { reference, questionId, answer: '' },
    onDone: () => showToast('Answer sent'),
  })
  return (
    <ActionForm form={form} label="Answer to the staff">
      <TextAreaField
        name="answer"
        label="Your answer"
        help="It goes to the staff without names, and is kept with its date."
        rows={4}
        limit={2000}
      />
      <div>
        <SubmitButton busyWord="Sending">Send the answer</SubmitButton>
      </div>
    </ActionForm>
  )
}
