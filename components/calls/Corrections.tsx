import type { Correction } from '@/lib/domain/calls/types'
import { formatUtcWithYear } from '@/lib/format'

/** Dated corrections of a call, the newest first. */
export function Corrections({ corrections }: { corrections: readonly Correction[] }) {
  return (
    <ol className="plain-list">
      {corrections.map(({ id, concerns, body, at }) => (
        <li key={id} className="grid gap-x-8 border-t border-rule py-3 sm:grid-cols-[210px_1fr]">
          <time dateTime={at.toISOString()} className="text-table text-muted">
            {formatUtcWithYear(at)}
          </time>
          <div className="max-w-prose">
            <p className="m-0 font-semibold">{concerns}</p>
            <p className="mt-1 text-table whitespace-pre-line">{body}</p>
          </div>
        </li>
      ))}
    </ol>
  )
}
