'use client'

import { Button } from '@/components/ui/Button'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { greyZone, isGrey } from '@/lib/domain/rankings/rules'
import type { RankingView } from '@/lib/domain/rankings/rankingView'
import { countInWords, formatHoursFromSeconds } from '@/lib/format'

export interface LinePanelProps {
  view: RankingView
  busy: string | null
  /** Null where the line can no longer, or not yet, be moved. */
  onMove: ((direction: 'up' | 'down') => void) | null
}

/** The line as a zone: who is in it, what is asked above it against what is on offer, and moving it. */
export function LinePanel({ view, busy, onMove }: LinePanelProps) {
  const zone = greyZone(view.rows.map((row) => row.chance))
  const grey = view.rows.filter((row) => isGrey(row.chance)).length
  return (
    <section>
      <SectionHeading dense title={zone ? 'The line is a zone' : 'The line'} />
      <p className="mt-2 text-table">
        {zone ? (
          <>
            <strong className="text-lamp">
              {countInWords(grey, 'proposal', 'proposals', true)} between ranks {zone.first} and {zone.last}{' '}
              {grey === 1 ? 'belongs' : 'belong'} above it with 20 to 80 chances in 100.
            </strong>{' '}
            The scores do not decide between them: discuss.
          </>
        ) : view.scores === 0 ? (
          'There is no score yet: where it falls follows from the hours alone.'
        ) : view.rows.every((row) => row.chance === null) ? (
          'There are too few scores to tell how sure it is: where it falls follows from the hours alone.'
        ) : (
          'No proposal is in doubt: the scores decide who stands above the line.'
        )}
      </p>
      <p className="mt-2 text-table">
        {view.line === 0 ? 'Nothing stands above it.' : null}
        {view.line > 0
          ? view.telescopes.map((telescope) => (
              <span
                key={telescope.id}
                className={
                  telescope.askedSeconds > telescope.offeredSeconds ? 'block font-semibold' : 'block'
                }
              >
                {telescope.proposals} ask {telescope.name} for{' '}
                {formatHoursFromSeconds(telescope.askedSeconds)} of the{' '}
                {formatHoursFromSeconds(telescope.offeredSeconds)} on offer.
              </span>
            ))
          : null}
      </p>
      {onMove ? (
        <div className="mt-3 flex flex-wrap gap-2">
          <Button look="secondary" size="small" busy={busy === 'line'} onClick={() => onMove('up')}>
            Line up one
          </Button>
          <Button look="secondary" size="small" busy={busy === 'line'} onClick={() => onMove('down')}>
            Line down one
          </Button>
        </div>
      ) : null}
    </section>
  )
}
