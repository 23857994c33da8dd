import { Panel } from '@/components/ui/Panel'
import { TextLink } from '@/components/ui/TextLink'
import type { FeeView } from '@/lib/domain/fees/readFee'
import { formatDayWithYear, formatMoney } from '@/lib/format'
import { paths } from '@/lib/paths'
import { affiliationWords } from './affiliationWords'
import { FeeActions, type FeeDeeds } from './FeeActions'
import { FeeTimeline } from './FeeTimeline'
import { feeStanding } from './feeStanding'

/** One fee: how it stands, everything that happened to it, and what can be done. */
export function FeeDesk({ fee, deeds }: { fee: FeeView; deeds: FeeDeeds }) {
  const standing = feeStanding(fee)
  const { openInvoice: invoice } = fee
  return (
    <Panel bar="accent" title={fee.reference} aside="times in UTC">
      <p className="m-0 text-table text-muted">
        {fee.lead}, {fee.kind.toLowerCase()}, {affiliationWords[fee.affiliationClass]}
      </p>
      <p className="mt-1 mb-0 flex flex-wrap items-baseline gap-x-2">
        <span className="text-figure font-semibold">{formatMoney(fee.amountMinor, fee.currency)}</span>
        <span className={`text-table font-semibold ${standing.className}`}>{standing.words}</span>
      </p>
      {fee.lateMinor > 0 ? (
        <p className="m-0 text-table text-muted">
          of it {formatMoney(fee.lateMinor, fee.currency)} for sending late
        </p>
      ) : null}
      {invoice ? (
        <p className="mt-2 mb-0 text-table">
          {invoice.number} to {invoice.institute},{' '}
          <span className={invoice.isOverdue ? 'font-semibold text-lamp' : undefined}>
            {invoice.isOverdue ? 'overdue since' : 'to be paid by'} {formatDayWithYear(invoice.dueAt)}
          </span>
        </p>
      ) : null}
      <div className="mt-5">
        <FeeTimeline events={fee.events} />
      </div>
      <div className="mt-5 border-t border-rule pt-4 text-table">
        <p className="mt-0 mb-4 flex flex-wrap gap-x-5 gap-y-2">
          {fee.receipt ? (
            <TextLink href={paths.proposalReceipt(fee.reference)} download>
              Receipt {fee.receipt}
            </TextLink>
          ) : null}
          {fee.papers.map((number) => (
            <TextLink key={number} href={paths.proposalBill(fee.reference, number)} download>
              {number}
            </TextLink>
          ))}
        </p>
        <FeeActions
          key={`${fee.state}-${fee.givenBackMinor}-${fee.lostDispute?.disputeId ?? ''}`}
          fee={fee}
          deeds={deeds}
        />
      </div>
    </Panel>
  )
}
