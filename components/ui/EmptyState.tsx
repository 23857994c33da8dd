import type { ReactNode } from 'react'

export interface EmptyStateProps {
  title: string
  /** One sentence that says what to do next. */
  children: ReactNode
  /** At most two buttons. */
  actions?: ReactNode
}

/** Nothing here yet: three empty rules, the lamp, and what to do next. */
export function EmptyState({ title, children, actions }: EmptyStateProps) {
  return (
    <div className="rounded border border-dashed border-edge p-6 max-sm:p-4">
      <svg
        width="160"
        height="20"
        viewBox="0 0 160 20"
        aria-hidden="true"
        focusable="false"
        className="text-rule"
      >
        <path d="M0 7.5H160M0 13.5H160M0 19.5H160" stroke="currentColor" />
        <circle cx="4" cy="3.5" r="3.5" fill="var(--lamp)" />
      </svg>
      <h2 className="mt-3 text-body font-semibold">{title}</h2>
      <p className="mt-1 max-w-prose text-table text-muted">{children}</p>
      {actions ? <div className="mt-4 flex flex-wrap gap-3">{actions}</div> : null}
    </div>
  )
}
