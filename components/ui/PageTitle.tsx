import type { ReactNode } from 'react'
import { classNames } from './classNames'

export interface PageTitleProps {
  title: ReactNode
  /** One sentence under the title. */
  lead?: ReactNode
  /** 40 px, for the title of a proposal or the name of an object. */
  display?: boolean
  /** Links and at most one filled button, at the right. */
  actions?: ReactNode
}

/** The h1 of a page, its one sentence, and what can be done from here. */
export function PageTitle({ title, lead, display = false, actions }: PageTitleProps) {
  return (
    <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-4">
      <div className={display ? undefined : 'max-w-prose'}>
        <h1
          className={classNames(
            display ? 'text-display max-sm:text-figure' : 'text-title',
            '[overflow-wrap:anywhere]',
          )}
        >
          {title}
        </h1>
        {lead ? <p className="mt-1 max-w-prose text-body text-muted">{lead}</p> : null}
      </div>
      {actions ? (
        <div className="flex flex-wrap items-center gap-4 text-table max-sm:w-full">{actions}</div>
      ) : null}
    </div>
  )
}
