import { BarNote } from '@/components/ui/BarNote'
import { TextLink } from '@/components/ui/TextLink'
import { countInWords, formatMoney, formatUtcInstant } from '@/lib/format'
import { paths } from '@/lib/paths'

interface UndecidedDisputesProps {
  disputes: readonly {
    reference: string
    title: string
    callNumber: number
    amountMinor: number
    currency: string
    lostAt: Date
  }[]
}

/** Lost disputes of all calls that wait for a decision; nothing where there are none. */
export function UndecidedDisputes({ disputes }: UndecidedDisputesProps) {
  if (disputes.length === 0) return null
  return (
    <BarNote tone="not-feasible">
      <h2 className="m-0 text-body font-semibold">
        {countInWords(disputes.length, 'lost dispute waits', 'lost disputes wait', true)} for a decision
      </h2>
      <ul className="plain-list mt-1">
        {disputes.map((one) => (
          <li key={`${one.reference} ${one.lostAt.getTime()}`}>
            <TextLink href={paths.officeFee(one.reference)}>{one.reference}</TextLink>, call {one.callNumber}:{' '}
            {formatMoney(one.amountMinor, one.currency)}, gone since {formatUtcInstant(one.lostAt)}
          </li>
        ))}
      </ul>
    </BarNote>
  )
}
