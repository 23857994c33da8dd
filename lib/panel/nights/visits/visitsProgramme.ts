import { ProgrammeBuilder } from '../../solver/programmeBuilder'
import type { Programme } from '../../solver/types'
import { runsOf } from './runsOf'
import type { AskedVisit, PlacedVisit, VisitNight } from './types'

/** A visit that is to have so many nights. */
export interface CountedVisit {
  visit: AskedVisit
  count: number
}

const hour = 3600
/** Worth less than a second of usable time a season: it only says which of two equals. */
const earlier = 1e-7

/** Visits on dates as an integer programme: the most usable hours in all, of equals the earlier. */
export class VisitsProgramme {
  private readonly builder = new ProgrammeBuilder()
  /** By visit: each column with the nights it stands for. */
  private readonly choices: {
    visit: AskedVisit
    columns: { column: number; nights: readonly VisitNight[] }[]
  }[]

  constructor(counted: readonly CountedVisit[]) {
    const ofHalf = new Map<number, number[]>()
    this.choices = counted.map(({ visit, count }) => {
      const sets = visit.together ? runsOf(visit, count) : visit.mayBe.map((night) => [night])
      const columns = sets.map((nights) => {
        const objective = nights.reduce(
          (sum, { usableSeconds, day }) => sum + usableSeconds / hour - day * earlier,
          0,
        )
        const column = this.builder.column({ objective, lower: 0, upper: 1, isInteger: true })
        for (const half of nights.flatMap(({ halves }) => halves))
          ofHalf.set(half, [...(ofHalf.get(half) ?? []), column])
        return { column, nights }
      })
      const wanted = visit.together ? 1 : count
      this.builder.row(
        wanted,
        wanted,
        columns.map(({ column }) => [column, 1] as const),
      )
      return { visit, columns }
    })
    for (const columns of ofHalf.values())
      if (columns.length > 1)
        this.builder.row(
          -Infinity,
          1,
          columns.map((column) => [column, 1] as const),
        )
  }

  build(): Programme {
    return this.builder.build()
  }

  /** The nights of each visit, as solved. */
  placedBy(values: Float64Array): PlacedVisit[] {
    return this.choices.map(({ visit, columns }) => ({
      visit,
      nights: columns.flatMap(({ column, nights }) => ((values[column] ?? 0) > 0.5 ? nights : [])),
    }))
  }
}
