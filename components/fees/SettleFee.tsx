'use client'

import { useState } from 'react'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { useActionForm } from '@/components/forms/useActionForm'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { askForWaiverSchema, startPaymentSchema, type AskForWaiverInput } from '@/lib/domain/fees/schema'
import { formatMoneyShort } from '@/lib/format'

interface SettleFeeProps {
  reference: string
  amountMinor: number
  currency: string
  mayAskForWaiver: boolean
  pay: FormAction<{ reference: string }, unknown>
  ask: FormAction<AskForWaiverInput, unknown>
}

/** Pays a fee that is still due, or asks for it to be waived. */
export function SettleFee({ reference, amountMinor, currency, mayAskForWaiver, pay, ask }: SettleFeeProps) {
  const [asks, setAsks] = useState(false)
  const payment = useActionForm({ schema: startPaymentSchema, action: pay, defaultValues: { reference } })
  const waiver = useActionForm({
    schema: askForWaiverSchema,
    action: ask,
    defaultValues: { reference, reason: '' },
    onDone: () => setAsks(false),
  })
  return (
    <div className="flex flex-col gap-4">
      {asks ? (
        <ActionForm form={waiver} label="Ask for a waiver">
          <TextAreaField
            name="reason"
            label="Why the fee should be waived"
            help="Read by the office alone."
            rows={4}
            limit={2000}
          />
          <SubmitButton full busyWord="Asking">
            Ask for a waiver
          </SubmitButton>
        </ActionForm>
      ) : (
        <ActionForm form={payment} label="Pay the fee">
          <SubmitButton full busyWord="Opening">
            Pay {formatMoneyShort(amountMinor, currency)}
          </SubmitButton>
        </ActionForm>
      )}
      {mayAskForWaiver ? (
        <p className="m-0 text-table">
          <LinkLikeButton onClick={() => setAsks(!asks)} aria-expanded={asks}>
            {asks ? 'Pay by card instead' : 'Ask for a waiver'}
          </LinkLikeButton>
        </p>
      ) : null}
    </div>
  )
}
