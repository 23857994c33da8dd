import { SectionHeading } from '@/components/ui/SectionHeading'
import type { DateAhead } from '@/lib/domain/submission/weeksAhead'
import { formatDay, formatUtcMinute } from '@/lib/format'

/** What happens next, each date with a tick. */
export function WeeksAhead({ dates }: { dates: readonly DateAhead[] }) {
  return (
    <section aria-labelledby="weeks-ahead">
      <SectionHeading id="weeks-ahead" title="The weeks ahead" />
      <ol className="plain-list mt-3 border-b border-rule">
        {dates.map(({ id, at, dayOnly, words }) => (
          <li key={id} className="grid gap-x-6 border-t border-rule py-3 sm:grid-cols-[13.25rem_1fr]">
            <div className="flex items-baseline gap-5">
              <span aria-hidden="true" className="inline-block h-2.5 w-[1.5px] shrink-0 self-center bg-ink" />
              <time className="whitespace-nowrap" dateTime={at.toISOString()}>
                <strong className="font-semibold">{formatDay(at)}</strong>
                {dayOnly ? null : <span className="text-table text-muted"> {formatUtcMinute(at)} UTC</span>}
              </time>
            </div>
            <span className="max-sm:pl-6">{words}</span>
          </li>
        ))}
      </ol>
    </section>
  )
}
