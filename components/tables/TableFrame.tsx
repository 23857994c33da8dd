import type { ReactNode, Ref } from 'react'
import { classNames } from '@/components/ui/classNames'

export interface TableFrameProps {
  caption: string
  phone: 'cards' | 'scroll'
  /** Set for a long table that scrolls within its frame, its head held: how many rows it has in all. */
  rowCount?: number
  /** Set for a table that one types into: a key then paints one row. */
  isTyped?: boolean
  frame?: Ref<HTMLDivElement>
  children: ReactNode
}

/**
 * The table element in a frame that scrolls sideways where it must. The roles are said aloud because cards on phones
 * are made by CSS `display`, which would take a table's own meaning away.
 */
export function TableFrame({ caption, phone, rowCount, isTyped, frame, children }: TableFrameProps) {
  return (
    <div
      ref={frame}
      className={classNames('focus-visible:-outline-offset-3', rowCount ? 'table-tall' : 'overflow-x-auto')}
      role="region"
      aria-label={`${caption}, scrolls sideways where it is wider than the screen`}
      tabIndex={0}
    >
      <table
        role="table"
        aria-rowcount={rowCount}
        className={classNames('data-table', `data-table-${phone}`, isTyped && 'table-typed')}
      >
        <caption className="sr-only">{caption}</caption>
        {children}
      </table>
    </div>
  )
}
