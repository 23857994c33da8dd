'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { useActionForm } from '@/components/forms/useActionForm'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import {
  askForWaiverSchema,
  startPaymentSchema,
  type AskForInvoiceForm,
  type AskForWaiverInput,
} from '@/lib/domain/fees/schema'
import { formatMoneyShort } from '@/lib/format'
import { InvoiceForm } from './InvoiceForm'

interface SettleFeeProps {
  reference: string
  amountMinor: number
  currency: string
  may: { askForWaiver: boolean; askForInvoice: boolean }
  /** Of whoever leads: the invoice begins with it. */
  institute: string
  pay: FormAction<{ reference: string }, unknown>
  ask: FormAction<AskForWaiverInput, unknown>
  invoice: FormAction<AskForInvoiceForm, { number: string }>
}

type Way = 'card' | 'waiver' | 'invoice'

const ways: Record<Way, string> = {
  card: 'Pay by card',
  invoice: 'Have it invoiced to an institute',
  waiver: 'Ask for a waiver',
}

/** Pays a fee that is still due, has it invoiced to an institute, or asks for it to be waived. */
export function SettleFee(props: SettleFeeProps) {
  const { reference, amountMinor, currency, may, institute, pay, ask, invoice } = props
  const router = useRouter()
  const [way, setWay] = useState<Way>('card')
  const payment = useActionForm({ schema: startPaymentSchema, action: pay, defaultValues: { reference } })
  const waiver = useActionForm({
    schema: askForWaiverSchema,
    action: ask,
    defaultValues: { reference, reason: '' },
    onDone: () => setWay('card'),
  })
  const open: Way[] = [
    'card',
    ...(may.askForInvoice ? (['invoice'] as const) : []),
    ...(may.askForWaiver ? (['waiver'] as const) : []),
  ]
  return (
    <div className="flex flex-col gap-4">
      {way === 'waiver' ? (
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
      ) : null}
      {way === 'invoice' ? (
        <InvoiceForm
          reference={reference}
          institute={institute}
          action={invoice}
          onDone={(number) => {
            showToast(`Invoice ${number} is on its way`)
            router.refresh()
          }}
        />
      ) : null}
      {way === 'card' ? (
        <ActionForm form={payment} label="Pay the fee">
          <SubmitButton full busyWord="Opening">
            Pay {formatMoneyShort(amountMinor, currency)}
          </SubmitButton>
        </ActionForm>
      ) : null}
      {open.length > 1 ? (
        <p className="m-0 flex flex-wrap gap-x-5 gap-y-2 text-table">
          {open
            .filter((one) => one !== way)
            .map((one) => (
              <LinkLikeButton key={one} onClick={() => setWay(one)}>
                {ways[one]}
              </LinkLikeButton>
            ))}
        </p>
      ) : null}
    </div>
  )
}
