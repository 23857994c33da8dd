import { ProgrammeBuilder } from '../solver/programmeBuilder'
import type { Programme } from '../solver/types'
import { BinFlow } from './binFlow'
import type { BinnedLine, BinnedPart, NightBin } from './binTypes'

export const hour = 3600

/** A line in the programme: the columns of each part, hours in each bin. */
export interface PlacedLine {
  line: BinnedLine
  parts: number[][]
}

/** Hours of proposals in bins as a mixed-integer programme; what is given elsewhere keeps every second it finds. */
export class NightsProgramme {
  private readonly programme = new ProgrammeBuilder()
  private readonly inBin: number[][]
  /** Columns of proposals that a known plan gives time. */
  private readonly begun: number[] = []

  constructor(
    private readonly bins: readonly NightBin[],
    standing: readonly BinnedLine[],
  ) {
    this.inBin = bins.map(() => [])
    const flow = new BinFlow(bins.map(({ seconds }) => seconds))
    for (const part of standing.flatMap(({ parts }) => parts)) {
      const found = flow.secondsOf(flow.lay(part)) / hour
      this.part(part, 0, found, found)
    }
  }

  /**
   * A proposal that gets time on all its lines, each between its least and its whole, or none: a column of 0 or 1. The
   * solver begins with those that are `isBegun`.
   */
  choose(
    lines: readonly BinnedLine[],
    gainAnHour: number,
    { isForced = false, isBegun = false }: { isForced?: boolean; isBegun?: boolean } = {},
  ): PlacedLine[] {
    const lower = isForced ? 1 : 0
    const isIn = this.programme.column({ objective: 0, lower, upper: 1, isInteger: true })
    if (isBegun || isForced) this.begun.push(isIn)
    return lines.map((line) => {
      const parts = line.parts.map((part) => this.part(part, gainAnHour, 0, part.seconds / hour))
      const all = parts.flat().map((column) => [column, 1] as const)
      this.programme.row(0, Infinity, [...all, [isIn, -Math.min(line.least, line.seconds) / hour] as const])
      this.programme.row(-Infinity, 0, [...all, [isIn, -line.seconds / hour] as const])
      return { line, parts }
    })
  }

  build(): Programme {
    this.bins.forEach(({ seconds }, at) =>
      this.programme.row(
        -Infinity,
        seconds / hour,
        (this.inBin[at] ?? []).map((column) => [column, 1] as const),
      ),
    )
    const programme = this.programme.build()
    if (this.begun.length === 0) return programme
    // Hours are left to the solver: it lays them by a linear programme once it knows who has any.
    const start = new Float64Array(programme.objective.length)
    for (const column of this.begun) start[column] = 1
    return { ...programme, start }
  }

  /** A part laid at a gain an hour; the sum of its hours lies between `least` and `most`. */
  private part(part: BinnedPart, gain: number, least: number, most: number): number[] {
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
}
