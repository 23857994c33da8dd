'use client'

import { useQueryClient } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { useState } from 'react'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { Button } from '@/components/ui/Button'
import { showToast } from '@/components/ui/showToast'
import type { FeeView } from '@/lib/domain/fees/readFee'
import type {
  AskForInvoiceForm,
  CancelInvoiceForm as CancelInput,
  DecideDisputeForm,
  RecordTransferForm,
  RefundFeeForm,
  SettleInvoiceForm as SettleInput,
} from '@/lib/domain/fees/schema'
import { CancelInvoiceForm } from './CancelInvoiceForm'
import { DisputeForm } from './DisputeForm'
import { InvoiceForm } from './InvoiceForm'
import { RefundForm } from './RefundForm'
import { SettleInvoiceForm } from './SettleInvoiceForm'
import { TransferForm } from './TransferForm'

export interface FeeDeeds {
  refund: FormAction<RefundFeeForm, { amount: string }>
  invoice: FormAction<AskForInvoiceForm, { number: string }>
  settle: FormAction<SettleInput, unknown>
  cancel: FormAction<CancelInput, { creditNote: string }>
  transfer: FormAction<RecordTransferForm, unknown>
  dispute: FormAction<DecideDisputeForm, unknown>
}

type Deed = 'refund' | 'invoice' | 'settle' | 'cancel'

/** What the office can do about a fee as it stands; one form open at a time. */
export function FeeActions({ fee, deeds }: { fee: FeeView; deeds: FeeDeeds }) {
  const router = useRouter()
  const queries = useQueryClient()
  const [open, setOpen] = useState<Deed | null>(null)
  const done = (words: string) => {
    setOpen(null)
    showToast(words)
    router.refresh()
    // The table beside it asks for its rows itself.
    void queries.invalidateQueries({ queryKey: ['office-proposals', fee.callSlug] })
  }
  const invoice = fee.openInvoice
  const choices: [Deed, string, boolean][] = [
    ['refund', 'Give back …', fee.refundableMinor > 0],
    ['invoice', 'Write an invoice …', fee.state === 'due'],
    ['settle', 'Settle the invoice …', invoice !== null],
    ['cancel', 'Take it back …', invoice !== null],
  ]
  return (
    <div className="flex flex-col gap-5">
      {fee.lostDispute ? (
        <DisputeForm
          lost={fee.lostDispute}
          currency={fee.currency}
          action={deeds.dispute}
          onDone={() => done('The dispute is decided')}
        />
      ) : null}
      {fee.transfers.map((transfer) => (
        <TransferForm
          key={transfer.refundId}
          {...transfer}
          currency={fee.currency}
          action={deeds.transfer}
          onDone={() => done('The transfer is on record')}
        />
      ))}
      <div className="flex flex-wrap gap-3">
        {choices
          .filter(([, , isOn]) => isOn)
          .map(([deed, label]) => (
            <Button
              key={deed}
              look="secondary"
              size="small"
              aria-expanded={open === deed}
              onClick={() => setOpen(open === deed ? null : deed)}
            >
              {label}
            </Button>
          ))}
      </div>
      {open === 'refund' ? (
        <RefundForm {...fee} action={deeds.refund} onDone={(amount) => done(`${amount} goes back`)} />
      ) : null}
      {open === 'invoice' ? (
        <InvoiceForm
          reference={fee.reference}
          institute={fee.institute}
          action={deeds.invoice}
          onDone={(number) => done(`Invoice ${number} is on its way`)}
        />
      ) : null}
      {open === 'settle' && invoice ? (
        <SettleInvoiceForm
          number={invoice.number}
          currency={fee.currency}
          action={deeds.settle}
          onDone={() => done('The fee is settled')}
        />
      ) : null}
      {open === 'cancel' && invoice ? (
        <CancelInvoiceForm
          number={invoice.number}
          action={deeds.cancel}
          onDone={(creditNote) => done(`Taken back by ${creditNote}`)}
        />
      ) : null}
    </div>
  )
}
