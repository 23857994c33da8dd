import type { NightsRow } from '@/lib/domain/decisions/nightsView'

export interface TrialChanges {
  /** Review numbers of proposals that come in, and that go out. */
  comeIn: string[]
  goOut: string[]
  /** Review numbers with the seconds they would have more, or fewer (negative). */
  differ: { reviewNumber: string; seconds: number }[]
}

const sum = (row: NightsRow, of: (line: NightsRow['lines'][number]) => number) =>
  row.lines.reduce((total, line) => total + of(line), 0)

/** What a trial would change of the suggestion as it stands, in ranking order. */
export function trialChanges(rows: readonly NightsRow[]): TrialChanges {
  const changes: TrialChanges = { comeIn: [], goOut: [], differ: [] }
  for (const row of rows) {
    const stands = sum(row, (line) => line.standsSeconds ?? line.suggestedSeconds)
    const tried = sum(row, (line) => line.suggestedSeconds)
    if (stands === tried) continue
    if (stands === 0) changes.comeIn.push(row.reviewNumber)
    else if (tried === 0) changes.goOut.push(row.reviewNumber)
    else changes.differ.push({ reviewNumber: row.reviewNumber, seconds: tried - stands })
  }
  return changes
}
