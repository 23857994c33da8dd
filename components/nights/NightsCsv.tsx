'use client'

import { saveText } from '@/components/tables/saveText'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import type { NightsView } from '@/lib/domain/decisions/readNights'
import { csvText } from '@/lib/format'

const head = [
  'Rank',
  'Review number',
  'Title',
  'Telescope',
  'Instrument',
  'Asked (h)',
  'Least useful (h)',
  'Suggested (h)',
  'Given (h)',
  'Reserve',
  'Service',
  'Conditions',
]

/** The hours as a file. */
export function NightsCsv({ view }: { view: NightsView }) {
  const save = () =>
    saveText(
      `nights-call-${view.callNumber}.csv`,
      csvText(
        head,
        view.rows.flatMap((row) =>
          row.lines.map((line) => [
            row.rank,
            row.reviewNumber,
            row.title,
            line.telescope,
            line.instrument,
            line.askedSeconds / 3600,
            line.leastSeconds / 3600,
            line.suggestedSeconds / 3600,
            line.givenSeconds / 3600,
            line.isReserve ? 'yes' : 'no',
            line.service,
            line.conditions,
          ]),
        ),
      ),
    )
  return <LinkLikeButton onClick={save}>CSV</LinkLikeButton>
}
