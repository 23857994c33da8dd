import { ABSENT, formatNumber, formatSigned } from '@/lib/format'
import { isGrey } from '../rankings/rules'
import type { ReportRow } from './reportFacts'

const hours = (seconds: number) => formatNumber(seconds / 3600, 1)

/** The chance as it is shown everywhere: its ends say no more than that they are ends. */
export const chanceWords = (chance: number | null): string =>
  chance === null ? ABSENT : chance > 0.99 ? '> 0.99' : chance < 0.01 ? '< 0.01' : formatNumber(chance, 2)

/** Hours given, reserve not counted. */
export const givenSeconds = ({ decision }: ReportRow): number =>
  (decision?.lines ?? []).reduce((sum, line) => sum + (line.isReserve ? 0 : line.seconds), 0)

/** A row of the ranked table in words. */
export function rankedWords(row: ReportRow): string[] {
  const { ranked, decision } = row
  return [
    String(ranked.rank),
    ranked.reviewNumber,
    ranked.setAside ? `${ranked.title} (set aside)` : ranked.title,
    formatNumber(ranked.raw, 2),
    ranked.merit === null ? ABSENT : `${formatNumber(ranked.merit, 2)} (${formatSigned(ranked.shift, 2)})`,
    ranked.low === null || ranked.high === null ? ABSENT : `${ranked.low} to ${ranked.high}`,
    isGrey(ranked.chance) ? `${chanceWords(ranked.chance)} grey` : chanceWords(ranked.chance),
    hours(ranked.askedSeconds),
    hours(givenSeconds(row)),
    decision?.outcome ?? ABSENT,
  ]
}
