'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { refundFeeSchema, type RefundFeeForm } from '@/lib/domain/fees/schema'
import { formatAmount, formatMoney } from '@/lib/format'

interface RefundFormProps {
  reference: string
  currency: string
  refundableMinor: number
  givenBackMinor: number
  action: FormAction<RefundFeeForm, { amount: string }>
  onDone: (amount: string) => void
}

/** Gives a fee back, whole or in part; the reference is typed, since money does not come back by a click. */
export function RefundForm(props: RefundFormProps) {
  const { reference, currency, refundableMinor, givenBackMinor, action, onDone } = props
  const form = useActionForm({
    schema: refundFeeSchema,
    action,
    defaultValues: {
      reference,
      givenBackMinor,
      amount: formatAmount(refundableMinor, currency).replaceAll(',', ''),
      reason: '',
      typed: '',
    },
    onDone: ({ amount }) => onDone(amount),
  })
  return (
    <ActionForm form={form} label="Give the fee back">
      <TextField
        name="amount"
        label="Amount"
        help={`At most ${formatMoney(refundableMinor, currency)}.`}
        unit={currency}
        inputMode="decimal"
        width="short"
      />
      <TextField name="reason" label="Why" help="Stands on the credit note." />
      <TextField name="typed" label={`Type the reference, ${reference}`} width="short" />
      <div>
        <SubmitButton busyWord="Giving back">Give it back</SubmitButton>
      </div>
    </ActionForm>
  )
}
