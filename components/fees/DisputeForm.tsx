'use client'

import { useWatch } from 'react-hook-form'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { RadioField, type RadioOption } from '@/components/forms/RadioField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { BarNote } from '@/components/ui/BarNote'
import type { FeeView } from '@/lib/domain/fees/readFee'
import { decideDisputeSchema, type DecideDisputeForm } from '@/lib/domain/fees/schema'
import { formatMoney } from '@/lib/format'

interface DisputeFormProps {
  lost: NonNullable<FeeView['lostDispute']>
  currency: string
  action: FormAction<DecideDisputeForm, unknown>
  onDone: () => void
}

type Decision = DecideDisputeForm['decision']

const options: readonly (RadioOption & { value: Decision })[] = [
  {
    value: 'ask-again',
    label: 'Ask for the fee again',
    help: 'by card, invoice or waiver; unsettled, it lapses',
  },
  { value: 'waive', label: 'Waive the fee', help: 'the proposal stays in' },
  { value: 'withdraw', label: 'Withdraw the proposal', help: 'nothing is owed; it cannot be taken back' },
  { value: 'accept', label: 'Take the loss', help: 'the fee and the proposal stay as they are' },
]

/** What becomes of a fee whose payment the bank took back. */
export function DisputeForm({ lost, currency, action, onDone }: DisputeFormProps) {
  const offered = options.filter(({ value }) => lost.choices.includes(value))
  const form = useActionForm({
    schema: decideDisputeSchema,
    action,
    defaultValues: {
      disputeId: lost.disputeId,
      graceDays: '14',
      note: '',
      ...(lost.choices.length === 1 ? { decision: lost.choices[0] } : {}),
    },
    onDone: () => onDone(),
  })
  const decision = useWatch({ control: form.form.control, name: 'decision' })
  return (
    <ActionForm form={form} label="Decide the lost dispute">
      <BarNote tone="not-feasible">
        <p className="m-0">
          The bank took {formatMoney(lost.amountMinor, currency)} back. Say what becomes of it.
        </p>
      </BarNote>
      <RadioField name="decision" label="What becomes of the fee" options={offered} />
      {decision === 'ask-again' ? (
        <TextField
          name="graceDays"
          label="To be settled within"
          unit="days"
          width="short"
          inputMode="numeric"
        />
      ) : null}
      <TextField
        name="note"
        label="Why"
        help={decision === 'accept' ? 'Stands in the logbook.' : 'Stands in the letter to those who lead it.'}
      />
      <div>
        <SubmitButton busyWord="Deciding">Decide this</SubmitButton>
      </div>
    </ActionForm>
  )
}
