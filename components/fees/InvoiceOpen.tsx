import { Panel } from '@/components/ui/Panel'
import { TextLink } from '@/components/ui/TextLink'
import type { SentFee } from '@/lib/domain/submission/readSent'
import { formatDayWithYear, formatMoney } from '@/lib/format'
import { paths } from '@/lib/paths'

interface InvoiceOpenProps {
  reference: string
  fee: Pick<SentFee, 'amountMinor' | 'currency'>
  invoice: NonNullable<SentFee['invoice']>
}

/** An institute has the invoice: who, by when, and the paper. */
export function InvoiceOpen({ reference, fee, invoice }: InvoiceOpenProps) {
  return (
    <Panel
      bar={invoice.isOverdue ? 'lamp' : 'accent'}
      title="The fee goes by invoice"
      aside={formatMoney(fee.amountMinor, fee.currency)}
    >
      <p className="mt-0 mb-4">
        {invoice.institute} is to pay by {formatDayWithYear(invoice.dueAt)}
        {invoice.isOverdue ? ', and has not yet. Ask there, or write to the office.' : '.'} While the invoice
        is open, the proposal stays in.
      </p>
      <p className="m-0 text-table">
        <TextLink href={paths.proposalBill(reference, invoice.number)} download>
          Invoice {invoice.number} as PDF
        </TextLink>
      </p>
    </Panel>
  )
}
