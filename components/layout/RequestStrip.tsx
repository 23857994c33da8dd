import type { ReactNode } from 'react'
import { classNames } from '@/components/ui/classNames'
import { StripCell, type StripCellProps } from './StripCell'
import { StripShell } from './StripShell'

export interface RequestStripProps {
  /** Six or so, in the order they are read; the first is flush with the page. */
  cells: readonly StripCellProps[]
  /** At the right: when it was saved, over the link to the history. The last cell on phones, unless one is for phones only. */
  saved?: ReactNode
  history?: ReactNode
}

/** What the request comes to, on every page of a proposal: sticky, one line; a grid on phones. */
export function RequestStrip({ cells, saved, history }: RequestStripProps) {
  return (
    <StripShell label="The request">
      <dl className="m-0 flex min-w-0 grow items-stretch max-sm:contents">
        {cells.map((cell) => (
          <StripCell key={cell.label} {...cell} />
        ))}
      </dl>
      <div
        className={classNames(
          'strip-cell flex flex-col justify-center text-tick text-muted sm:pl-5 sm:text-right sm:whitespace-nowrap',
          cells.some((cell) => cell.phoneOnly) && 'max-sm:hidden',
        )}
      >
        {saved}
        {history ? <span className="text-table max-xl:hidden">{history}</span> : null}
      </div>
    </StripShell>
  )
}
