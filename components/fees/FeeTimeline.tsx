import { Timeline } from '@/components/ui/Timeline'
import type { FeeEvent } from '@/lib/domain/fees/feeEvents'
import { formatDayWithYear, formatUtcClock } from '@/lib/format'

/** Everything that happened to a fee, day by day, to the second, with who did it. */
export function FeeTimeline({ events }: { events: readonly FeeEvent[] }) {
  const days = new Map<string, FeeEvent[]>()
  for (const event of events) {
    const day = formatDayWithYear(event.at)
    days.set(day, [...(days.get(day) ?? []), event])
  }
  return (
    <Timeline
      days={[...days].map(([day, ofDay]) => ({
        day,
        entries: ofDay.map(({ at, words, who, tone }) => ({
          time: formatUtcClock(at).replace(' UTC', ''),
          words: who ? `${words} (${who})` : words,
          tone,
        })),
      }))}
    />
  )
}
