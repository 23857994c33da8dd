'use client'

import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { ProgressBar } from '@/components/ui/ProgressBar'
import { UnderlineChoice } from '@/components/ui/UnderlineChoice'
import { formatNumber } from '@/lib/format'
import { seasonsRun } from './startSeasons'
import type { Seasons } from './useSeasons'

export interface SeasonsNoteProps {
  seasons: Seasons
  of: 'suggested' | 'given'
  /** Null where there is no choice. */
  onOf: ((of: 'suggested' | 'given') => void) | null
}

const total = formatNumber(seasonsRun.seasons)

function words({ state, done }: Seasons): string {
  switch (state) {
    case 'reading':
      return 'The plan is being read.'
    case 'running':
      return `${formatNumber(done)} of ${total} seasons of weather run.`
    case 'stopped':
      return `Stopped after ${formatNumber(done)} of ${total} seasons.`
    case 'failed':
      return 'The seasons could not be run. The rest of the page does without them.'
    case 'no-weather':
      return 'No weather is on record for this site, so nothing is known of what it takes. The office can record it, or you try a share of nights lost.'
    default:
      return `Run through ${total} seasons of weather. The bar: how often it is observed in full, with the 95 % interval of so many seasons. The hours: what it has in the poorest and in the best tenth of them.`
  }
}

/** How far the seasons are, and of what they are. */
export function SeasonsNote({ seasons, of, onOf }: SeasonsNoteProps) {
  const { state, done, stop, again } = seasons
  if (state === 'off') return null
  return (
    <section aria-label="Seasons of weather" className="mt-6 mb-4 text-table">
      <div className="flex flex-wrap items-center justify-between gap-x-8 gap-y-2">
        <p role="status" className="m-0 max-w-prose text-muted">
          {words(seasons)} {state === 'running' ? <LinkLikeButton onClick={stop}>Stop</LinkLikeButton> : null}
          {state === 'stopped' || state === 'failed' ? (
            <LinkLikeButton onClick={again}>Run them again</LinkLikeButton>
          ) : null}
        </p>
        {onOf ? (
          <UnderlineChoice
            label="Run"
            shown
            options={[
              { value: 'suggested', label: 'what is suggested' },
              { value: 'given', label: 'what is given' },
            ]}
            value={of}
            onChange={onOf}
          />
        ) : null}
      </div>
      {state === 'running' ? (
        <div className="mt-2">
          <ProgressBar share={done / seasonsRun.seasons} label="Seasons of weather run" />
        </div>
      ) : null}
    </section>
  )
}
