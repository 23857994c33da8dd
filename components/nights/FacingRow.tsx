import { HoursBar } from '@/components/charts/HoursBar'
import { linkClasses } from '@/components/ui/linkClasses'
import { Tag } from '@/components/ui/Tag'
import { choiceMarks } from '@/lib/domain/decisions/choiceWords'
import type { NightsLine } from '@/lib/domain/decisions/nightsView'
import type { ShownRow } from './nightsColumns'
import { hoursOf, standsInWords, termsInWords, visitSuggestedInWords, whyNotInWords } from './nightsWords'
import { OutlookMark } from './OutlookMark'

export interface FacingRowProps {
  row: ShownRow
  mostHours: number
  firstTelescope: number | undefined
  isOpen: boolean
  onOpen: (() => void) | null
}

const barPx = 150
const lineClasses =
  'flex flex-wrap items-center gap-x-3 max-sm:justify-between max-sm:text-right max-sm:[&>svg]:hidden'

/** On phones the sides lie under each other and say which they are. */
const Side = ({ children }: { children: string }) => <span className="text-muted sm:hidden">{children}</span>

function Hours({ line, seconds }: { line: NightsLine; seconds: number }) {
  const isPart = seconds > 0 && seconds < line.wholeSeconds
  return <span className={isPart ? 'text-marginal' : undefined}>{hoursOf(line, seconds)}</span>
}

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
      width={barPx}
    />
  )
  return (
    <div role="row" className="facing-grid items-center py-1.5 text-table max-sm:py-3">
      <div role="cell">
        {row.lines.map((line) => (
          <div key={line.instrumentId} className={`${lineClasses} justify-end`}>
            <Side>{`Suggested, ${line.instrument}`}</Side>
            {line.suggestedSeconds > 0 ? (
              <span>
                <Hours line={line} seconds={line.suggestedSeconds} />
                {line.suggestedEvenings ? (
                  <span className="text-muted">{visitSuggestedInWords(line)}</span>
                ) : null}
                {standsInWords(line) ? <span className="text-lamp">{standsInWords(line)}</span> : null}
              </span>
            ) : (
              <span className="text-muted max-sm:ml-auto">
                {whyNotInWords(line)}
                {standsInWords(line) ? <span className="text-lamp">{standsInWords(line)}</span> : null}
              </span>
            )}
            {bar(line, line.suggestedSeconds, 'left')}
          </div>
        ))}
      </div>
      <div role="rowheader" className="flex items-baseline gap-3 max-sm:order-first">
        <span className="w-6 shrink-0 text-right text-muted max-sm:w-5">{row.rank}</span>
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
        <span className="text-muted">
          {row.title}
          {row.tried || row.choice ? (
            <>
              {' '}
              <Tag>
                {row.tried ? `tried: ${row.tried === 'rank' ? 'by rank' : choiceMarks[row.tried]}` : null}
                {!row.tried && row.choice ? choiceMarks[row.choice.choice] : null}
              </Tag>
            </>
          ) : null}
        </span>
      </div>
      <div role="cell">
        {row.lines.map((line) => (
          <div key={line.instrumentId} className={lineClasses}>
            {bar(line, line.givenSeconds, 'right')}
            <Side>{`Given, ${line.instrument}`}</Side>
            {line.givenSeconds > 0 ? (
              <span className="max-sm:ml-auto">
                <Hours line={line} seconds={line.givenSeconds} />
                <span className="text-muted">
                  <span className="max-sm:hidden"> {line.instrument}</span>
                  {termsInWords(line)}
                </span>
              </span>
            ) : (
              <span className="text-muted">
                none<span className="max-sm:hidden">, {line.instrument}</span>
              </span>
            )}
          </div>
        ))}
      </div>
      <div role="cell">
        {row.lines.map((line, at) => (
          <div key={line.instrumentId} className={lineClasses}>
            <Side>{`Observed in full, ${line.instrument}`}</Side>
            <OutlookMark outlook={row.outlooks[at] ?? null} />
          </div>
        ))}
      </div>
    </div>
  )
}
