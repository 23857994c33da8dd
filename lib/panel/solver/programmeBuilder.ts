import type { Programme } from './types'

interface Column {
  objective: number
  lower: number
  upper: number
  isInteger: boolean
}

/** Collects columns and rows one by one and packs them as a programme. */
export class ProgrammeBuilder {
  private readonly columns: Column[] = []
  private readonly rowLower: number[] = []
  private readonly rowUpper: number[] = []
  private readonly starts: number[] = [0]
  private readonly indices: number[] = []
  private readonly values: number[] = []

  /** Adds a column and gives its index. */
  column(column: Column): number {
    return this.columns.push(column) - 1
  }

  /** Adds the row `lower <= sum of coefficient * column <= upper`; each column at most once. */
  row(lower: number, upper: number, entries: Iterable<readonly [column: number, coefficient: number]>): void {
    for (const [column, coefficient] of entries) {
      this.indices.push(column)
      this.values.push(coefficient)
    }
    this.starts.push(this.indices.length)
    this.rowLower.push(lower)
    this.rowUpper.push(upper)
  }

  build(): Programme {
    return {
      objective: Float64Array.from(this.columns, (column) => column.objective),
      lower: Float64Array.from(this.columns, (column) => column.lower),
      upper: Float64Array.from(this.columns, (column) => column.upper),
      isInteger: Int32Array.from(this.columns, (column) => (column.isInteger ? 1 : 0)),
      rowLower: Float64Array.from(this.rowLower),
      rowUpper: Float64Array.from(this.rowUpper),
      starts: Int32Array.from(this.starts),
      indices: Int32Array.from(this.indices),
      values: Float64Array.from(this.values),
    }
  }
}
