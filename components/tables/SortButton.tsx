import type { ReactNode } from 'react'

export interface SortButtonProps {
  children: ReactNode
  /** How the column is sorted now, if it is. */
  direction: 'ascending' | 'descending' | undefined
  onSort: () => void
}

/** A head's words as the button that sorts by them; the arrow, 8 px, points the way the values grow. */
export function SortButton({ children, direction, onSort }: SortButtonProps) {
  return (
    <button type="button" onClick={onSort}>
      {children}
      {direction ? (
        <svg
          width="8"
          height="8"
          viewBox="0 0 8 8"
          aria-hidden="true"
          focusable="false"
          className="ml-1 inline-block"
        >
          <path d={direction === 'descending' ? 'M0 1.5H8L4 7Z' : 'M0 6.5H8L4 1Z'} fill="currentColor" />
        </svg>
      ) : null}
    </button>
  )
}
