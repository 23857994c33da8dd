import type { AccountBalance } from '@/lib/domain/fees/types'
import { accountWords } from '@/lib/domain/fees/movementWords'
import { ABSENT, formatAmount } from '@/lib/format'

interface LedgerAccountsProps {
  balances: readonly AccountBalance[]
  currency: string
}

/** The chart of accounts with what stands on each: money and claims above, where they came from below, and nought. */
export function LedgerAccounts({ balances, currency }: LedgerAccountsProps) {
  const amounts = new Map(
    balances.filter((balance) => balance.currency === currency).map(({ account, minor }) => [account, minor]),
  )
  const whole = [...amounts.values()].reduce((sum, minor) => sum + minor, 0)
  return (
    <dl className="m-0 text-table" aria-label={`Accounts in ${currency}`}>
      <div className="flex justify-between gap-4 border-t-[1.5px] border-ink py-2 text-caption font-semibold">
        <dt>Account</dt>
        <dd className="m-0">{currency}</dd>
      </div>
      {Object.entries(accountWords).map(([account, words]) => {
        const minor = amounts.get(account as AccountBalance['account']) ?? 0
        return (
          <div key={account} className="flex justify-between gap-4 border-t border-rule py-1.5">
            <dt>{words}</dt>
            <dd className="m-0 text-right tabular-nums">
              {minor === 0 ? <span className="text-muted">{ABSENT}</span> : formatAmount(minor, currency)}
            </dd>
          </div>
        )
      })}
      <div className="flex justify-between gap-4 py-2 font-semibold rule-total">
        <dt>In all</dt>
        <dd className="m-0 text-right tabular-nums">{formatAmount(whole, currency)}</dd>
      </div>
    </dl>
  )
}
