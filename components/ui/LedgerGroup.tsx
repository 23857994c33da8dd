import { useId, type ReactNode } from 'react'

export interface LedgerGroupProps {
  title: string
  children: ReactNode
}

/** One question of a ledger list with its rows. */
export function LedgerGroup({ title, children }: LedgerGroupProps) {
  const id = useId()
  return (
    <section aria-labelledby={id} className="grid rule-open sm:grid-cols-[13.375rem_minmax(0,1fr)]">
      <h2 id={id} className="py-3 pr-1 text-body font-semibold max-sm:text-table">
        {title}
      </h2>
      <div className="divide-y divide-rule max-sm:border-t max-sm:border-rule sm:border-l sm:border-rule">
        {children}
      </div>
    </section>
  )
}
