import type { FormAction } from '@/components/forms/actionFormTypes'
import { Panel } from '@/components/ui/Panel'
import type { AskForInvoiceForm, AskForWaiverInput } from '@/lib/domain/fees/schema'
import type { SentProposal } from '@/lib/domain/submission/readSent'
import { formatMoney, formatUtc } from '@/lib/format'
import { InvoiceOpen } from './InvoiceOpen'
import { SettleFee } from './SettleFee'

interface FeeDueProps {
  sent: SentProposal
  /** The payment firm did not answer when the proposal was sent. */
  isUnanswered: boolean
  isTestMode: boolean
  pay: FormAction<{ reference: string }, unknown>
  ask: FormAction<AskForWaiverInput, unknown>
  invoice: FormAction<AskForInvoiceForm, { number: string }>
}

/** What is still to be settled, by when, and the way to do it; nothing once it is. */
export function FeeDue({ sent, isUnanswered, isTestMode, pay, ask, invoice }: FeeDueProps) {
  const { fee, contents, may } = sent
  if (fee?.invoice) return <InvoiceOpen fee={fee} invoice={fee.invoice} reference={contents.reference} />
  if (fee?.state !== 'due') return null
  const { waiver } = fee
  return (
    <Panel bar="lamp" title="The fee" aside={formatMoney(fee.amountMinor, fee.currency)}>
      {isUnanswered ? (
        <p className="mt-0 mb-3">The payment firm does not answer at the moment. Try again in a minute.</p>
      ) : null}
      {fee.failure ? <p className="mt-0 mb-3 text-not-feasible">{fee.failure}</p> : null}
      {waiver?.state === 'asked' ? (
        <p className="mt-0 mb-4">A waiver is asked for. The office decides it, and writes to you.</p>
      ) : null}
      {waiver?.state === 'refused' ? (
        <p className="mt-0 mb-4">The waiver was refused{waiver.note ? `: ${waiver.note}` : '.'}</p>
      ) : null}
      <p className="mt-0 mb-4 text-table text-muted">
        The proposal is in all the same. The fee is due by {formatUtc(fee.dueAt)}.
        {isTestMode ? ' Payments are in test mode: no money moves.' : ''}
      </p>
      {may.pay ? (
        <SettleFee
          reference={contents.reference}
          amountMinor={fee.amountMinor}
          currency={fee.currency}
          may={may}
          institute={contents.people.find(({ role }) => role === 'pi')?.institute ?? ''}
          pay={pay}
          ask={ask}
          invoice={invoice}
        />
      ) : null}
    </Panel>
  )
}
