import { ProgrammeBuilder } from '../solver/programmeBuilder'
import type { Solve, SolveLimits } from '../solver/types'
import { BinFlow } from './binFlow'
import type { BinnedLine, BinnedPart, BinnedPlan, NightBin } from './binTypes'
import { byRankInBins } from './byRankInBins'

export interface MeritInput {
  /** In ranking order. */
  asked: readonly (readonly BinnedLine[])[]
  /** How many of them stand above the line. */
  line: number
  bins: readonly NightBin[]
  /** Given elsewhere, laid first. */
  standing: readonly BinnedLine[]
  /** Merit of a proposal, above 0. */
  merit: ReadonlyMap<number, number>
}

export interface MeritPlan extends BinnedPlan {
  /** Merit times hours above the line, as found, and what no plan can exceed. */
  meritHours: number
  boundMeritHours: number
}

const hour = 3600
const tenthOfAnHour = 360

interface PlacedLine {
  line: BinnedLine
  /** Columns of each part. */
  parts: number[][]
}

/** Columns of the hours of parts in bins, and the rows that hold them together. */
class Season {
  readonly programme = new ProgrammeBuilder()
  private readonly inBin: number[][]

  constructor(private readonly bins: readonly NightBin[]) {
    this.inBin = bins.map(() => [])
  }

  /** A part laid at a gain an hour; the sum of its hours lies between `least` and `most`. */
  part(part: BinnedPart, gain: number, least: number, most: number): number[] {
    const columns = [...part.usable].map(([bin, seconds]) => {
      const column = this.programme.column({
        objective: gain,
        lower: 0,
        upper: seconds / hour,
        isInteger: false,
      })
      this.inBin[bin]?.push(column)
      return column
    })
    this.programme.row(
      least,
      most,
      columns.map((column) => [column, 1] as const),
    )
    return columns
  }

  close() {
    this.bins.forEach(({ seconds }, at) =>
      this.programme.row(
        -Infinity,
        seconds / hour,
        (this.inBin[at] ?? []).map((column) => [column, 1] as const),
      ),
    )
    return this.programme.build()
  }
}

/** Given elsewhere: every second that finds a place keeps one, though not this one. */
function layStanding(season: Season, { bins, standing }: MeritInput): void {
  const flow = new BinFlow(bins.map(({ seconds }) => seconds))
  for (const part of standing.flatMap(({ parts }) => parts)) {
    const found = flow.secondsOf(flow.lay(part)) / hour
    season.part(part, 0, found, found)
  }
}

/** A proposal that gets time on all its lines, each between its least and its whole, or none: a column of 0 or 1. */
function choose(season: Season, lines: readonly BinnedLine[], merit: number): PlacedLine[] {
  const { programme } = season
  const isIn = programme.column({ objective: 0, lower: 0, upper: 1, isInteger: true })
  return lines.map((line) => {
    const parts = line.parts.map((part) => season.part(part, merit, 0, part.seconds / hour))
    const all = parts.flat().map((column) => [column, 1] as const)
    programme.row(0, Infinity, [...all, [isIn, -Math.min(line.least, line.seconds) / hour] as const])
    programme.row(-Infinity, 0, [...all, [isIn, -line.seconds / hour] as const])
    return { line, parts }
  })
}

/** The line as the solver gives it: whole within some seconds, or full tenths of an hour. Null where it gives none. */
function asSolved({ line, parts }: PlacedLine, values: Float64Array): BinnedLine | null {
  const found = parts.map((columns) =>
    Math.round(columns.reduce((sum, column) => sum + (values[column] ?? 0), 0) * hour),
  )
  const total = found.reduce((sum, seconds) => sum + seconds, 0)
  if (total >= line.seconds - 2 * parts.length) return line
  const seconds = Math.floor(total / tenthOfAnHour) * tenthOfAnHour
  if (seconds < Math.min(line.least, tenthOfAnHour)) return null
  let left = seconds
  const shared = line.parts.map((part, at): BinnedPart => {
    const own = Math.min(left, found[at] ?? 0)
    left -= own
    return { ...part, seconds: own }
  })
  // Tenths may fall just short of what is least.
  return { ...line, seconds, least: Math.min(line.least, seconds), parts: shared }
}

/**
 * Most merit above the line: awards, whole or in part, with the greatest sum of merit times hours among the proposals
 * above the line; then the others fill what remains, by rank. A mixed-integer programme; a sentence where the
 * solver has no answer.
 */
export async function mostMeritInBins(
  input: MeritInput,
  solve: Solve,
  limits: SolveLimits,
): Promise<MeritPlan | { why: string }> {
  const { asked, line, bins, standing, merit } = input
  const above = asked.slice(0, line).filter((lines) => lines.every(({ possible }) => possible))
  // A solver has no answer to a programme of nothing.
  if (above.length === 0) return { ...byRankInBins(asked, bins, standing), meritHours: 0, boundMeritHours: 0 }
  const season = new Season(bins)
  layStanding(season, input)
  const placed = above.map((lines) => choose(season, lines, merit.get(lines[0]?.proposal ?? 0) ?? 0))
  const answer = await solve(season.close(), limits)
  if (answer.values === null) return { why: answer.why }
  const { values } = answer
  const chosen = placed.flatMap((lines) => {
    const solved = lines.map((one) => asSolved(one, values))
    return solved.every((one) => one !== null) ? [solved as BinnedLine[]] : []
  })
  const isChosen = new Set(chosen.map((lines) => lines[0]?.proposal))
  const rest = asked.filter((lines) => !isChosen.has(lines[0]?.proposal))
  const plan = byRankInBins([...chosen, ...rest], bins, standing)
  const isAbove = new Set(above.map((lines) => lines[0]?.proposal))
  const meritHours = plan.given
    .filter(({ proposal }) => isAbove.has(proposal))
    .reduce((sum, { proposal, seconds }) => sum + ((merit.get(proposal) ?? 0) * seconds) / hour, 0)
  return { ...plan, meritHours, boundMeritHours: Math.max(meritHours, answer.bound) }
}
