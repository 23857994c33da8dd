'use client'

import { useState } from 'react'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { CheckboxField } from '@/components/forms/CheckboxField'
import { LeftOutNote } from '@/components/submission/LeftOutNote'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { useActionForm } from '@/components/forms/useActionForm'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { sendSchema, type SendInput } from '@/lib/domain/submission/schema'
import { formatDay, formatMoneyShort } from '@/lib/format'

interface SendFormProps {
  reference: string
  /** Made with the page: pressing twice sends once. */
  idempotencyKey: string
  declaration: string
  /** Names of those who have yet to agree. */
  leftOut: readonly string[]
  fee: { amountMinor: number; currency: string; dueAt: Date } | null
  action: FormAction<SendInput, unknown>
}

/** The declaration and the one button; beside it the two ways of settling the fee later. */
export function SendForm({ reference, idempotencyKey, declaration, leftOut, fee, action }: SendFormProps) {
  const [asksWaiver, setAsksWaiver] = useState(false)
  const form = useActionForm({
    schema: sendSchema,
    action,
    defaultValues: {
      reference,
      idempotencyKey,
      declaration: false,
      then: fee ? 'pay' : 'later',
      waiverReason: '',
    },
  })
  const choose = (then: SendInput['then']) => form.form.setValue('then', then)
  const sendLater = () => {
    choose('later')
    form.submit()
  }
  const turnWaiver = (on: boolean) => {
    setAsksWaiver(on)
    choose(on ? 'waiver' : 'pay')
  }
  const label = fee ? `Send it in for ${formatMoneyShort(fee.amountMinor, fee.currency)}` : 'Send it in'
  return (
    <ActionForm form={form}>
      <LeftOutNote reference={reference} names={leftOut} />
      <CheckboxField name="declaration" label={<span className="text-table">{declaration}</span>} />
      {asksWaiver ? (
        <TextAreaField
          name="waiverReason"
          label="Why the fee should be waived"
          help="Read by the office alone. The proposal is in while the office decides."
          rows={4}
          limit={2000}
        />
      ) : null}
      <SubmitButton full busyWord="Sending">
        {asksWaiver ? 'Send it in and ask for a waiver' : label}
      </SubmitButton>
      {fee ? (
        <div className="flex flex-wrap justify-between gap-x-6 gap-y-2 text-table">
          <LinkLikeButton onClick={sendLater}>Send it in, settle by {formatDay(fee.dueAt)}</LinkLikeButton>
          <LinkLikeButton onClick={() => turnWaiver(!asksWaiver)} aria-expanded={asksWaiver}>
            {asksWaiver ? 'Pay by card instead' : 'Ask for a waiver'}
          </LinkLikeButton>
        </div>
      ) : null}
    </ActionForm>
  )
}
