import type { ReactNode } from 'react'

export interface TableFrameProps {
  caption: string
  phone: 'cards' | 'scroll'
  children: ReactNode
}

/**
 * The table element in a frame that scrolls sideways where it must. The roles are said aloud because cards on phones
 * are made by CSS `display`, which would take a table's own meaning away.
 */
export function TableFrame({ caption, phone, children }: TableFrameProps) {
  return (
    <div
      className="overflow-x-auto focus-visible:-outline-offset-3"
      role="region"
      aria-label={`${caption}, scrolls sideways where it is wider than the screen`}
      tabIndex={0}
    >
      <table role="table" className={`data-table data-table-${phone}`}>
        <caption className="sr-only">{caption}</caption>
        {children}
      </table>
    </div>
  )
}
