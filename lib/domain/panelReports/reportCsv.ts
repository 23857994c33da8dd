import { csvText, type CsvValue } from '@/lib/format'
import { isGrey } from '../rankings/rules'
import { givenSeconds } from './rankedWords'
import type { ReportFacts } from './reportFacts'

const head = [
  'Rank',
  'Review number',
  'Title',
  'Raw mean',
  'Merit',
  'Shift',
  'Rank lies from',
  'Rank lies to',
  'P above the line',
  'Grey zone',
  'Above the line',
  'Set aside',
  'Asked (h)',
  'Given (h)',
  'Outcome',
  'Conditions',
  'Changes by hand',
]

const rounded = (value: number | null, digits: number): CsvValue =>
  value === null ? '' : Number(value.toFixed(digits))
const yes = (is: boolean) => (is ? 'yes' : 'no')

/** The ranked table of a report, every number as it is. */
export function reportCsv({ rows, ranking }: ReportFacts): string {
  return csvText(
    head,
    rows.map((row) => {
      const { ranked, decision } = row
      return [
        ...[ranked.rank, ranked.reviewNumber, ranked.title],
        ...[rounded(ranked.raw, 4), rounded(ranked.merit, 4), rounded(ranked.shift, 4)],
        ...[ranked.low ?? '', ranked.high ?? '', rounded(ranked.chance, 4)],
        ...[yes(isGrey(ranked.chance)), yes(ranked.rank <= ranking.line), yes(ranked.setAside)],
        ...[rounded(ranked.askedSeconds / 3600, 3), rounded(givenSeconds(row) / 3600, 3)],
        decision?.outcome ?? '',
        (decision?.lines ?? []).flatMap(({ conditions }) => conditions || []).join('; '),
        ranked.moves.map(({ isUp, reason }) => `${isUp ? 'up' : 'down'}: ${reason}`).join('; '),
      ]
    }),
  )
}
