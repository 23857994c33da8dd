'use client'

import { useState } from 'react'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import type { NightsView } from '@/lib/domain/decisions/nightsView'
import { formatHoursFromSeconds, formatNumber } from '@/lib/format'
import { HeldForm } from './HeldForm'
import type { HoldHoursAction } from './nightsActions'
import { plannedInWords } from './nightsWords'
import { SeasonCells } from './SeasonCells'

export interface OfferedHoursProps {
  telescope: NightsView['telescopes'][number]
  view: Pick<NightsView, 'panelId' | 'seasonFrom' | 'weather' | 'hasRanking'>
  /** Null where nothing can be held back any more. */
  hold: HoldHoursAction | null
}

/** Hours on offer on one telescope, what of them is held back and given, and where the suggestion lays them. */
export function OfferedHours({ telescope, view, hold }: OfferedHoursProps) {
  const [isHolding, setHolding] = useState(false)
  const { name, offeredSeconds, givenSeconds, heldSeconds } = telescope
  const left = offeredSeconds - givenSeconds - heldSeconds
  return (
    <section aria-label={`Hours on offer on ${name}`} className="min-w-0">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6 pt-3 rule-open">
        <h2 className="text-body font-semibold">{name}</h2>
        <p className="m-0 text-table">
          <strong>{formatNumber(givenSeconds / 3600, 1)}</strong> given of{' '}
          {formatHoursFromSeconds(offeredSeconds)}, <strong>{formatHoursFromSeconds(left)}</strong> left
        </p>
      </div>
      <div className="mt-2 h-2 w-full bg-rule" aria-hidden="true">
        <div
          className="h-full bg-accent transition-[width] duration-move"
          style={{
            width: `${offeredSeconds > 0 ? Math.min(100, (100 * givenSeconds) / offeredSeconds) : 0}%`,
          }}
        />
      </div>
      {view.hasRanking ? (
        <p className="mt-2 mb-0 flex flex-wrap items-baseline justify-between gap-x-6 text-table text-muted">
          <span>{plannedInWords(telescope, view.weather)}</span>
          {hold && !isHolding ? (
            <LinkLikeButton onClick={() => setHolding(true)}>
              {heldSeconds > 0 ? 'Change what is held back' : 'Hold hours back'}
            </LinkLikeButton>
          ) : null}
        </p>
      ) : null}
      {hold && isHolding ? (
        <HeldForm
          telescope={telescope}
          panelId={view.panelId}
          hold={hold}
          onLeave={() => setHolding(false)}
        />
      ) : null}
      <div className="mt-3">
        <SeasonCells telescope={telescope} seasonFrom={view.seasonFrom} />
      </div>
    </section>
  )
}
