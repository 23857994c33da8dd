import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { suppressSmall } from '@/lib/domain/statistics/suppressSmall'

/** Whether the sums that are published leave more than one real value for a hidden cell: then nobody can tell it. */
function isOpen(cells: (number | null)[][], row: number, column: number): boolean {
  // Sums are linear: the cell is open when some change of hidden cells keeps every row and column and moves it.
  const hidden = cells.flatMap((line, r) => line.flatMap((value, c) => (value === null ? [{ r, c }] : [])))
  const last = { r: cells.length - 1, c: (cells[0]?.length ?? 1) - 1 }
  const equations = [
    ...cells.map((_, r) => hidden.map((one) => (one.r === r ? (one.c === last.c ? -1 : 1) : 0))),
    ...(cells[0] ?? []).map((_, c) => hidden.map((one) => (one.c === c ? (one.r === last.r ? -1 : 1) : 0))),
  ]
  const rank = (matrix: number[][]) => {
    const rows = matrix.map((line) => [...line])
    let found = 0
    for (let column_ = 0; column_ < hidden.length; column_ += 1) {
      const pivot = rows.findIndex((line, index) => index >= found && Math.abs(line[column_] ?? 0) > 1e-9)
      if (pivot < 0) continue
      ;[rows[found], rows[pivot]] = [rows[pivot] as number[], rows[found] as number[]]
      const head = rows[found] as number[]
      for (let other = 0; other < rows.length; other += 1) {
        if (other === found) continue
        const line = rows[other] as number[]
        const factor = (line[column_] ?? 0) / (head[column_] ?? 1)
        rows[other] = line.map((value, index) => value - factor * (head[index] ?? 0))
      }
      found += 1
    }
    return found
  }
  const unit = hidden.map((one) => (one.r === row && one.c === column ? 1 : 0))
  return rank([...equations, unit]) > rank(equations)
}

describe('suppressSmall', () => {
  it('leaves a table without small counts as it is, with its totals', () => {
    expect(
      suppressSmall([
        [6, 0],
        [10, 7],
      ]),
    ).toEqual([
      [6, 0, 6],
      [10, 7, 17],
      [16, 7, 23],
    ])
  })

  it('hides small counts, and others so that no sum gives them back', () => {
    const cells = suppressSmall([
      [3, 20, 12],
      [9, 15, 30],
      [8, 7, 11],
    ])
    expect(cells[0]?.[0]).toBeNull()
    expect(cells[0]?.filter((value) => value === null).length).toBeGreaterThan(1)
    expect(cells.map((row) => row[0]).filter((value) => value === null).length).toBeGreaterThan(1)
    expect(cells[3]?.[3]).toBe(115)
  })

  it('hides the whole of a small table rather than a part that could be added up', () => {
    expect(
      suppressSmall([[1, 2]])
        .flat()
        .every((value) => value === null),
    ).toBe(true)
    expect(
      suppressSmall([[2]])
        .flat()
        .every((value) => value === null),
    ).toBe(true)
    expect(suppressSmall([])).toEqual([[]])
  })

  it('never shows a count from one to four, nor lets one be worked out from the sums', () => {
    const row = (length: number) =>
      fc.array(fc.integer({ min: 0, max: 14 }), { minLength: length, maxLength: length })
    const table = fc
      .tuple(fc.integer({ min: 1, max: 4 }), fc.integer({ min: 1, max: 4 }))
      .chain(([rows, columns]) => fc.array(row(columns), { minLength: rows, maxLength: rows }))
    fc.assert(
      fc.property(table, (counts) => {
        const cells = suppressSmall(counts)
        const all = cells.flat()
        expect(all.every((value) => value === null || value === 0 || value >= 5)).toBe(true)
        // Where everything is hidden there is nothing to add up.
        cells.forEach((line, r) =>
          line.forEach((value, c) => {
            const count = counts[r]?.[c]
            if (value === null && count !== undefined && count > 0 && count < 5)
              expect(isOpen(cells, r, c)).toBe(true)
          }),
        )
      }),
      { seed: 14, numRuns: 400 },
    )
  })
})
