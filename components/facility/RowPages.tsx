'use client'

import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { formatNumber } from '@/lib/format'
import { rowsAPage, type RowPages as Pages } from './useRowPages'

const mostNamed = 10

/** Which rows of a long table are shown, the ways to the others, and to those with a message. */
export function RowPages({ pages, count }: { pages: Pages; count: number }) {
  const { from, to, wrong, show } = pages
  if (count <= rowsAPage) return null
  const elsewhere = wrong.filter((index) => index < from || index >= to)
  return (
    <div className="mb-2 text-table">
      <div className="flex flex-wrap items-baseline gap-x-5 gap-y-1">
        <span role="status">
          Rows {formatNumber(from + 1)} to {formatNumber(to)} of {formatNumber(count)}
        </span>
        {from > 0 ? <LinkLikeButton onClick={() => show(0)}>First</LinkLikeButton> : null}
        {from > 0 ? <LinkLikeButton onClick={() => show(from - 1)}>Before</LinkLikeButton> : null}
        {to < count ? <LinkLikeButton onClick={() => show(to)}>After</LinkLikeButton> : null}
        {to < count ? <LinkLikeButton onClick={() => show(count - 1)}>Last</LinkLikeButton> : null}
      </div>
      {elsewhere.length > 0 ? (
        <p className="m-0 flex flex-wrap items-baseline gap-x-3 font-semibold text-not-feasible">
          <span>Also to mend: row</span>
          {elsewhere.slice(0, mostNamed).map((index) => (
            <LinkLikeButton key={index} aria-label={`Show row ${index + 1}`} onClick={() => show(index)}>
              {formatNumber(index + 1)}
            </LinkLikeButton>
          ))}
          {elsewhere.length > mostNamed ? (
            <span>and {formatNumber(elsewhere.length - mostNamed)} more</span>
          ) : null}
        </p>
      ) : null}
    </div>
  )
}
