'use client'

import { saveText } from '@/components/tables/saveText'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { choiceMarks } from '@/lib/domain/decisions/choiceWords'
import type { AwardOutlook } from '@/lib/panel/nights/seasonTypes'
import { csvText, type CsvValue } from '@/lib/format'
import type { ShownRow } from './nightsColumns'

const head = [
  'Rank',
  'Review number',
  'Title',
  'Telescope',
  'Instrument',
  'Asked (h)',
  'Least useful (h)',
  'Least set by',
  'Suggested (h)',
  'Given (h)',
  'Reserve',
  'Service',
  'Evenings of the visit',
  'Evenings suggested',
  'Conditions',
  'Laid down',
  'Why',
  'Observed in full (share of seasons)',
  'At least',
  'At most',
  'Poorest tenth of seasons (h)',
  'Middle season (h)',
  'Best tenth of seasons (h)',
]

export interface NightsCsvProps {
  callNumber: number
  /** The proposals shown, in their order. */
  rows: readonly ShownRow[]
}

const outlookCells = (outlook: AwardOutlook | null): CsvValue[] =>
  outlook
    ? [
        ...[outlook.chance, outlook.low, outlook.high].map((share) => Number(share.toFixed(4))),
        ...[outlook.seconds10, outlook.seconds50, outlook.seconds90].map((seconds) =>
          Number((seconds / 3600).toFixed(2)),
        ),
      ]
    : ['', '', '', '', '', '']

/** The hours as a file, a line for each instrument. */
export function NightsCsv({ callNumber, rows }: NightsCsvProps) {
  const save = () =>
    saveText(
      `nights-call-${callNumber}.csv`,
      csvText(
        head,
        rows.flatMap((row) =>
          row.lines.map((line, at) => [
            row.rank,
            row.reviewNumber,
            row.title,
            line.telescope,
            line.instrument,
            line.askedSeconds / 3600,
            line.leastSeconds / 3600,
            line.leastBy === 'half' ? '' : line.leastBy,
            line.suggestedSeconds / 3600,
            line.givenSeconds / 3600,
            line.isReserve ? 'yes' : 'no',
            line.service,
            line.evenings,
            line.suggestedEvenings,
            line.conditions,
            row.choice ? choiceMarks[row.choice.choice] : '',
            row.choice?.reason ?? '',
            ...outlookCells(row.outlooks[at] ?? null),
          ]),
        ),
      ),
    )
  return <LinkLikeButton onClick={save}>CSV</LinkLikeButton>
}
