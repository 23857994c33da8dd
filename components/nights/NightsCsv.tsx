'use client'

import { saveText } from '@/components/tables/saveText'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import type { NightsRow } from '@/lib/domain/decisions/nightsView'
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

export interface NightsCsvProps {
  callNumber: number
  /** The proposals shown, in their order. */
  rows: readonly NightsRow[]
}

/** The hours as a file, a line for each instrument. */
export function NightsCsv({ callNumber, rows }: NightsCsvProps) {
  const save = () =>
    saveText(
      `nights-call-${callNumber}.csv`,
      csvText(
        head,
        rows.flatMap((row) =>
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
