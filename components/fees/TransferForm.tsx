'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { recordTransferSchema, type RecordTransferForm } from '@/lib/domain/fees/schema'
import { formatMoney } from '@/lib/format'

interface TransferFormProps {
  refundId: number
  amountMinor: number
  currency: string
  action: FormAction<RecordTransferForm, unknown>
  onDone: () => void
}

/** Money of an institute goes back from the bank, not from here: this says that it has. */
export function TransferForm({ refundId, amountMinor, currency, action, onDone }: TransferFormProps) {
  const form = useActionForm({
    schema: recordTransferSchema,
    action,
    defaultValues: { refundId, bankReference: '' },
    onDone,
  })
  return (
    <ActionForm form={form} label="Transfer made">
      <p className="m-0">
        {formatMoney(amountMinor, currency)} is to be given back by transfer. Make it at the bank, then put it
        on record.
      </p>
      <TextField name="bankReference" label="Reference of the transfer" />
      <div>
        <SubmitButton look="secondary" busyWord="Recording">
          It has been transferred
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
