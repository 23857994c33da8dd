import type { ReactNode } from 'react'
import { Panel } from '@/components/ui/Panel'
import { formatAmount, formatMoney, formatUtc } from '@/lib/format'

interface FeePanelProps {
  label: string
  fee: { amountMinor: number; currency: string }
  /** Until then it comes back in full. */
  deadline: Date
  isTestMode: boolean
  children: ReactNode
}

/** What is owed, added up as on a bill, and the form that settles it. */
export function FeePanel({ label, fee, deadline, isTestMode, children }: FeePanelProps) {
  const rows = [
    [label, formatMoney(fee.amountMinor, fee.currency)],
    ['VAT, none is charged', formatAmount(0, fee.currency)],
  ] as const
  return (
    <Panel bar="lamp" title="The fee">
      <dl className="m-0 mt-4 text-body">
        {rows.map(([term, value], index) => (
          <div key={term} className="flex justify-between gap-4 border-t border-rule py-2.5">
            <dt className={index === 0 ? '' : 'text-muted'}>{term}</dt>
            <dd className="m-0 text-right">{value}</dd>
          </div>
        ))}
        <div className="flex justify-between gap-4 py-2.5 font-semibold rule-total">
          <dt>In all</dt>
          <dd className="m-0 text-right">{formatMoney(fee.amountMinor, fee.currency)}</dd>
        </div>
      </dl>
      <p className="mt-3 mb-5 text-table text-muted">
        Card details go to the payment firm’s own page. The fee comes back in full if you withdraw before{' '}
        {formatUtc(deadline)}.{isTestMode ? ' Payments are in test mode: no money moves.' : ''}
      </p>
      {children}
    </Panel>
  )
}
