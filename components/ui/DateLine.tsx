import { classNames } from './classNames'
import { formatDay, formatUtcMinute } from '@/lib/format'

export interface DateLineEntry {
  at: Date
  words: string
  /** True where only the day counts. */
  dayOnly?: boolean
}

export interface DateLineProps {
  entries: readonly DateLineEntry[]
  now: Date
  label: string
}

/** How far along the line now is: dates stand at even steps, time runs evenly between two of them. */
function passedShare(entries: readonly DateLineEntry[], now: number): number {
  const next = entries.findIndex((entry) => entry.at.getTime() > now)
  if (next === -1) return 1
  const [before, after] = [entries[next - 1], entries[next]]
  if (!before || !after) return 0
  const part = (now - before.at.getTime()) / (after.at.getTime() - before.at.getTime())
  return (next - 1 + part) / entries.length
}

/** The dates of something on one line: what has passed is thicker, the next deadline is lit. Upright on phones. */
export function DateLine({ entries, now, label }: DateLineProps) {
  const next = entries.find((entry) => entry.at > now)
  const share = passedShare(entries, now.getTime())
  return (
    <div className="relative">
      <svg
        aria-hidden="true"
        focusable="false"
        width="100%"
        height="12"
        className="absolute top-0 max-md:hidden"
      >
        <rect y="1.25" width="100%" height="1.5" fill="var(--ink)" />
        <rect y="0.25" width={`${(share * 100).toFixed(2)}%`} height="3.5" fill="var(--ink)" />
      </svg>
      <ol aria-label={label} className="plain-list grid gap-x-4 md:auto-cols-fr md:grid-flow-col">
        {entries.map((entry) => {
          const lit = entry === next
          return (
            <li
              key={`${entry.at.getTime()} ${entry.words}`}
              className="relative max-md:flex max-md:gap-3 max-md:py-2 md:pt-6"
            >
              <span
                aria-hidden="true"
                className={classNames(
                  'max-md:mt-1 max-md:shrink-0 md:absolute md:left-0',
                  lit ? 'h-4 w-1 bg-lamp md:-top-1.5' : 'h-2.5 w-[1.5px] bg-ink md:top-0.5',
                )}
              />
              <div>
                <div className={classNames('text-table', lit && 'text-lamp')}>
                  <span className="font-semibold">{formatDay(entry.at)}</span>
                  {entry.dayOnly ? null : (
                    <span className={lit ? undefined : 'text-muted'}> {formatUtcMinute(entry.at)} UTC</span>
                  )}
                </div>
                <div className="text-table text-muted">{entry.words}</div>
              </div>
            </li>
          )
        })}
      </ol>
    </div>
  )
}
