import type { BinnedLine, BinnedPart } from './binTypes'
import { hour, type PlacedLine } from './nightsProgramme'

const tenthOfAnHour = 360

/** The line as the solver gives it: whole within some seconds, or full tenths of an hour. Null where it gives none. */
export function solvedLine({ line, parts }: PlacedLine, values: Float64Array): BinnedLine | null {
  const found = parts.map((columns) =>
    Math.round(columns.reduce((sum, column) => sum + (values[column] ?? 0), 0) * hour),
  )
  const total = found.reduce((sum, seconds) => sum + seconds, 0)
  if (total >= line.seconds - 2 * parts.length) return line
  // Not below what is least for the sake of a round number, but for a second of the solver's tolerance.
  const tenths = Math.floor(total / tenthOfAnHour) * tenthOfAnHour
  const seconds = Math.max(tenths, Math.min(line.least, total))
  if (seconds < Math.min(line.least - 1, tenthOfAnHour) || seconds === 0) return null
  let left = seconds
  const shared = line.parts.map((part, at): BinnedPart => {
    const own = Math.min(left, found[at] ?? 0)
    left -= own
    return { ...part, seconds: own }
  })
  return { ...line, seconds, least: Math.min(line.least, seconds), parts: shared }
}
