import type { ReactNode } from 'react'
import { classNames } from './classNames'

export interface SectionHeadingProps {
  title: ReactNode
  /** Muted words and links at the right: how it was computed, Table, CSV. */
  aside?: ReactNode
  /** 19 px with an ink rule above, for dense pages and side columns. */
  dense?: boolean
  id?: string
}

/** The h2 of a section, with its notes and links at the right. */
export function SectionHeading({ title, aside, dense = false, id }: SectionHeadingProps) {
  return (
    <div
      className={classNames(
        'flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1',
        dense && 'pt-3 rule-open',
      )}
    >
      <h2 id={id} className={dense ? 'text-body font-semibold' : 'text-h2'}>
        {title}
      </h2>
      {aside ? (
        <div className="flex flex-wrap items-baseline gap-3 text-table text-muted">{aside}</div>
      ) : null}
    </div>
  )
}
