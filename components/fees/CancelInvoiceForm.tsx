'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { RadioField } from '@/components/forms/RadioField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { cancelInvoiceSchema, type CancelInvoiceForm as Form } from '@/lib/domain/fees/schema'

interface CancelInvoiceFormProps {
  number: string
  action: FormAction<Form, { creditNote: string }>
  onDone: (creditNote: string) => void
}

const choices = [
  { value: 'due', label: 'It is owed again', help: 'to be settled another way, within a week at least' },
  { value: 'nothing', label: 'Nothing is owed', help: 'the proposal stays in without a fee' },
]

/** Takes an invoice back by a credit note. */
export function CancelInvoiceForm({ number, action, onDone }: CancelInvoiceFormProps) {
  const form = useActionForm({
    schema: cancelInvoiceSchema,
    action,
    defaultValues: { number, reason: '' },
    onDone: ({ creditNote }) => onDone(creditNote),
  })
  return (
    <ActionForm form={form} label={`Take ${number} back`}>
      <TextField name="reason" label="Why" help="Stands on the credit note." />
      <RadioField name="then" label="What becomes of the fee" options={choices} />
      <div>
        <SubmitButton busyWord="Taking back">Take {number} back</SubmitButton>
      </div>
    </ActionForm>
  )
}
