import type { ReactNode } from 'react'
import { StripCell, type StripCellProps } from './StripCell'

export interface RequestStripProps {
  /** Six or so, in the order they are read; the first is flush with the page. */
  cells: readonly StripCellProps[]
  /** At the right: when it was saved, over the link to the history. */
  saved?: ReactNode
  history?: ReactNode
}

/** What the request comes to, on every page of a proposal: sticky, one line; a grid on phones. */
export function RequestStrip({ cells, saved, history }: RequestStripProps) {
  return (
    <section
      aria-label="The request"
      data-sticky
      className="sticky top-0 z-30 border-b-2 border-rule bg-surface px-gutter max-sm:px-0"
    >
      <div className="flex items-stretch sm:h-14">
        <dl className="m-0 flex min-w-0 grow items-stretch max-sm:grid max-sm:grid-cols-3">
          {cells.map((cell) => (
            <StripCell key={cell.label} {...cell} />
          ))}
        </dl>
        <div className="flex flex-col justify-center pl-5 text-right text-tick text-muted max-sm:hidden">
          {saved}
          {history ? <span className="text-table max-xl:hidden">{history}</span> : null}
        </div>
      </div>
    </section>
  )
}
