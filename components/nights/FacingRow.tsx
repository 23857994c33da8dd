import { HoursBar } from '@/components/charts/HoursBar'
import { linkClasses } from '@/components/ui/linkClasses'
import type { NightsLine, NightsRow } from '@/lib/domain/decisions/readNights'
import { hoursOf, whyNotInWords } from './nightsWords'

export interface FacingRowProps {
  row: NightsRow
  mostHours: number
  firstTelescope: number | undefined
  isOpen: boolean
  onOpen: (() => void) | null
}

const isPart = (seconds: number, line: NightsLine) => seconds > 0 && seconds < line.wholeSeconds

/** One proposal: what is suggested at the left, what is given at the right, a bar for each instrument. */
export function FacingRow({ row, mostHours, firstTelescope, isOpen, onOpen }: FacingRowProps) {
  const bar = (line: NightsLine, seconds: number, side: 'left' | 'right') => (
    <HoursBar
      asked={line.wholeSeconds / 3600}
      given={seconds / 3600}
      least={line.leastSeconds / 3600}
      maxHours={mostHours}
      side={side}
      tone={line.telescopeId === firstTelescope ? 's1' : 's3'}
      width={150}
    />
  )
  const words = (line: NightsLine, seconds: number) => (
    <span className={isPart(seconds, line) ? 'text-marginal' : undefined}>{hoursOf(line, seconds)}</span>
  )
  return (
    <div className="grid grid-cols-[minmax(0,1fr)_auto_minmax(0,1fr)] items-center gap-x-6 py-1.5 text-table max-sm:grid-cols-1 max-sm:gap-y-1">
      <div className="flex flex-col items-end gap-0.5 max-sm:items-start">
        {row.lines.map((line) => (
          <span key={line.instrumentId} className="inline-flex flex-wrap items-center justify-end gap-3">
            {line.suggestedSeconds > 0 ? (
              words(line, line.suggestedSeconds)
            ) : (
              <span className="text-muted">{whyNotInWords(line)}</span>
            )}
            <span className="max-sm:hidden">{bar(line, line.suggestedSeconds, 'left')}</span>
          </span>
        ))}
      </div>
      <div className="flex w-56 items-baseline gap-3 max-sm:order-first max-sm:w-auto">
        <span className="w-6 shrink-0 text-right text-muted">{row.rank}</span>
        {onOpen ? (
          <button
            type="button"
            aria-expanded={isOpen}
            onClick={onOpen}
            className={`${linkClasses} shrink-0 font-semibold max-sm:min-h-11`}
          >
            {row.reviewNumber}
          </button>
        ) : (
          <span className="shrink-0 font-semibold">{row.reviewNumber}</span>
        )}
        <span className="truncate text-muted" title={row.title}>
          {row.title}
        </span>
      </div>
      <div className="flex flex-col items-start gap-0.5">
        {row.lines.map((line) => (
          <span key={line.instrumentId} className="inline-flex flex-wrap items-center gap-3">
            {bar(line, line.givenSeconds, 'right')}
            {line.givenSeconds > 0 ? (
              <span>
                {words(line, line.givenSeconds)}
                <span className="text-muted">
                  {' '}
                  {line.instrument}
                  {line.isReserve ? ', in reserve' : ''}
                  {line.service === 'visitor' ? ', visitor' : ''}
                  {line.conditions ? `, ${line.conditions}` : ''}
                </span>
              </span>
            ) : (
              <span className="text-muted">none, {line.instrument}</span>
            )}
          </span>
        ))}
      </div>
    </div>
  )
}
