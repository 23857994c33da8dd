import type { ReactNode } from 'react'
import { classNames } from './classNames'

export interface Fact {
  term: ReactNode
  value: ReactNode
  /** Closes the list: bold, double ruled. */
  total?: boolean
}

export interface FactsProps {
  facts: Fact[]
  /** Stands above under an ink rule. */
  title?: string
}

/** Definition rows: the term muted at the left, its value at the right. */
export function Facts({ facts, title }: FactsProps) {
  return (
    <div className={title ? 'pt-3 rule-open' : undefined}>
      {title ? <h2 className="mb-2 text-body font-semibold">{title}</h2> : null}
      <dl className="m-0 text-table">
        {facts.map((fact, index) => (
          <div
            key={index}
            className={classNames(
              'flex items-baseline justify-between gap-4 py-2',
              fact.total ? 'font-semibold rule-total' : 'border-t border-rule last:border-b',
            )}
          >
            <dt className={fact.total ? undefined : 'text-muted'}>{fact.term}</dt>
            <dd className="m-0 min-w-0 text-right [overflow-wrap:anywhere]">{fact.value}</dd>
          </div>
        ))}
      </dl>
    </div>
  )
}
