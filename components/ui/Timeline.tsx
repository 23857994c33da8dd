import { classNames } from './classNames'

export type TimelineTone = 'plain' | 'settled' | 'refused' | 'deadline'

export interface TimelineEntry {
  /** To the second, without the zone, which the head names: `21:56:10`. */
  time: string
  words: string
  tone?: TimelineTone
}

export interface TimelineProps {
  days: { day: string; entries: readonly TimelineEntry[] }[]
}

const words: Record<TimelineTone, string> = {
  plain: '',
  settled: 'font-semibold',
  refused: 'text-not-feasible',
  deadline: 'font-semibold text-lamp',
}

function Tick({ tone }: { tone: TimelineTone }) {
  const shape = {
    plain: <path d="M3 6H13" stroke="var(--ink)" strokeWidth="1.5" />,
    settled: <path d="M1 6H15" stroke="var(--feasible)" strokeWidth="3" />,
    refused: <path d="M2 6H14" stroke="var(--not-feasible)" strokeWidth="2.5" strokeDasharray="3 1.8" />,
    deadline: <path d="M0 6H16" stroke="var(--lamp)" strokeWidth="3" />,
  }[tone]
  return (
    <svg width="16" height="12" aria-hidden="true" focusable="false" className="relative mt-1">
      {shape}
    </svg>
  )
}

/** What happened, to the second, as ticks on an upright line, day by day. */
export function Timeline({ days }: TimelineProps) {
  return (
    <div className="flex flex-col gap-4 text-table">
      {days.map(({ day, entries }) => (
        <section key={day} aria-label={day}>
          <h3 className="text-table font-semibold">{day}</h3>
          <ol className="timeline plain-list">
            {entries.map((entry, index) => (
              <li key={index} className="grid grid-cols-[4.25rem_16px_1fr] gap-x-3 py-1">
                <span className="text-muted">{entry.time}</span>
                <Tick tone={entry.tone ?? 'plain'} />
                <span className={classNames(words[entry.tone ?? 'plain'])}>{entry.words}</span>
              </li>
            ))}
          </ol>
        </section>
      ))}
    </div>
  )
}
