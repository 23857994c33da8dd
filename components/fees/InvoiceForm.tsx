'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { askForInvoiceSchema, type AskForInvoiceForm } from '@/lib/domain/fees/schema'

interface InvoiceFormProps {
  reference: string
  /** Where the institute of whoever leads is known. */
  institute: string
  action: FormAction<AskForInvoiceForm, { number: string }>
  onDone: (number: string) => void
}

/** Asks for an invoice to an institute: who pays, where, and their own order. */
export function InvoiceForm({ reference, institute, action, onDone }: InvoiceFormProps) {
  const form = useActionForm({
    schema: askForInvoiceSchema,
    action,
    defaultValues: { reference, institute, address: '', purchaseOrder: '', sendTo: '' },
    onDone: ({ number }) => onDone(number),
  })
  return (
    <ActionForm form={form} label="Ask for an invoice">
      <TextField name="institute" label="Institute that pays" />
      <TextAreaField
        name="address"
        label="Postal address"
        help="As it shall stand on the invoice."
        rows={4}
      />
      <TextField
        name="purchaseOrder"
        label="Purchase order"
        help="Their number, where they want one."
        optional
      />
      <TextField
        name="sendTo"
        type="email"
        inputMode="email"
        label="Mail it to"
        help="Their accounts office. You get a copy."
      />
      <SubmitButton full busyWord="Writing">
        Have the invoice written
      </SubmitButton>
    </ActionForm>
  )
}
