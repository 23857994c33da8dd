'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { settleInvoiceSchema, type SettleInvoiceForm as Form } from '@/lib/domain/fees/schema'

interface SettleInvoiceFormProps {
  number: string
  currency: string
  action: FormAction<Form, unknown>
  onDone: () => void
}

/** What the statement of the bank says about an invoice. */
export function SettleInvoiceForm({ number, currency, action, onDone }: SettleInvoiceFormProps) {
  const form = useActionForm({
    schema: settleInvoiceSchema,
    action,
    defaultValues: { number, amount: '', paidOn: '', bankReference: '' },
    onDone,
  })
  return (
    <ActionForm form={form} label={`Settle ${number}`}>
      <TextField name="amount" label="Amount received" unit={currency} inputMode="decimal" width="short" />
      <TextField name="paidOn" label="Day it arrived" help="Year-month-day, as 2027-04-02." width="short" />
      <TextField name="bankReference" label="Reference on the statement" />
      <div>
        <SubmitButton busyWord="Settling">Settle {number}</SubmitButton>
      </div>
    </ActionForm>
  )
}
