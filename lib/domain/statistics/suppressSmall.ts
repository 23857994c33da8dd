type Cells = (number | null)[][]

/** A count from 1 to this, less one, could point at someone. */
export const leastCount = 5

const transposed = (cells: Cells): Cells =>
  (cells[0] ?? []).map((_, column) => cells.map((row) => row[column] ?? null))

/** Hides the smallest count still shown of a line, one that counts something before a nought; false when none is left. */
function hideOneMore(line: (number | null)[]): number | null {
  const shown = line.flatMap((value, index) => (value === null ? [] : [{ value, index }]))
  shown.sort((a, b) => Number(a.value === 0) - Number(b.value === 0) || a.value - b.value)
  return shown[0]?.index ?? null
}

/** Whether a hidden cell is fixed by sums: no way leads from its row to its column over other hidden cells. */
function isGivenAway(cells: Cells, row: number, column: number): boolean {
  const seen = new Set([`r${row}`])
  const queue = [`r${row}`]
  for (let node = queue.pop(); node !== undefined; node = queue.pop()) {
    const at = Number(node.slice(1))
    const isRow = node.startsWith('r')
    cells.forEach((line, r) =>
      line.forEach((value, c) => {
        if (value !== null || (r === row && c === column) || (isRow ? r : c) !== at) return
        const next = isRow ? `c${c}` : `r${r}`
        if (!seen.has(next)) queue.push(next)
        seen.add(next)
      }),
    )
  }
  return !seen.has(`c${column}`)
}

/**
 * A table of counts with its totals (last row and last column), small counts hidden, and as many others that no sum
 * of a row or column gives one of them back.
 *
 * @param counts rows of counts without totals, all of one length, none negative
 * @returns the same with a total at the end of each row and a last row of totals; null where a count is hidden
 */
export function suppressSmall(counts: readonly (readonly number[])[], least = leastCount): Cells {
  const sum = (values: readonly number[]) => values.reduce((all, value) => all + value, 0)
  const withTotals = counts.map((row) => [...row, sum(row)])
  const columns = withTotals[0]?.length ?? 0
  const totals = Array.from({ length: columns }, (_, column) =>
    sum(withTotals.map((row) => row[column] ?? 0)),
  )
  const cells: Cells = [...withTotals, totals].map((row) =>
    row.map((value) => (value > 0 && value < least ? null : value)),
  )
  for (;;) {
    const next = cells
      .flatMap((line, row) =>
        line.flatMap((value, column) =>
          value === null && isGivenAway(cells, row, column) ? [{ row, column }] : [],
        ),
      )
      .map(({ row, column }) => ({
        row,
        column,
        alongRow: hideOneMore(cells[row] ?? []),
        alongColumn: hideOneMore(transposed(cells)[column] ?? []),
      }))
      .find(({ alongRow, alongColumn }) => alongRow !== null || alongColumn !== null)
    if (!next) return cells
    const { row, column, alongRow, alongColumn } = next
    if (alongRow !== null) (cells[row] ?? [])[alongRow] = null
    if (alongColumn !== null) (cells[alongColumn] ?? [])[column] = null
  }
}
