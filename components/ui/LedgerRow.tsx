import type { ReactNode } from 'react'
import { classNames } from './classNames'
import { TextLink } from './TextLink'

export interface LedgerRowProps {
  label: string
  /** Makes the label a link (a task list); without it the label is muted (a read-through). */
  href?: string
  children?: ReactNode
  /** Right-aligned: a `SectionState`, or an `Edit` link. */
  aside?: ReactNode
  /** Lights the row, for the section someone is in. */
  lit?: boolean
}

/** One row of a ledger list: label, what stands there, and its state or an edit link at the right. */
export function LedgerRow({ label, href, children, aside, lit = false }: LedgerRowProps) {
  return (
    <div
      className={classNames(
        'grid grid-cols-[1fr_auto] gap-x-4 py-3 sm:grid-cols-[6.5rem_1fr_auto] sm:pl-6',
        'max-sm:min-h-16',
        lit && 'bg-wash',
      )}
    >
      <div className={href ? 'font-semibold' : 'text-muted'}>
        {href ? <TextLink href={href}>{label}</TextLink> : label}
      </div>
      <div className="min-w-0 text-table leading-6 [overflow-wrap:anywhere] text-muted max-sm:col-span-2 max-sm:row-start-2">
        {children}
      </div>
      <div className="text-right max-sm:col-start-2 max-sm:row-start-1 sm:pr-3">{aside}</div>
    </div>
  )
}
