import type { TableColumn } from '@/components/tables/tableColumn'
import { plainHead, shownValue } from '@/lib/domain/tools/yardstick/exports/sheetText'
import type { Sheet, SheetColumn, SheetRow } from '@/lib/domain/tools/yardstick/sheets/sheet'
import type { ReadyUniverse } from '@/lib/domain/tools/yardstick/universes'
import { HeadOf } from './HeadOf'
import { OpeningNumber } from './OpeningNumber'
import { toneOf } from './toneOf'

/** How many neighbouring cells say the same reason; 0 for all but the first of them. */
function spanOf(columns: readonly SheetColumn[], { cells }: SheetRow, at: number): number {
  const words = cells[at]?.absent?.words
  if (words === undefined) return 1
  const same = (other: number) =>
    columns[other]?.place === columns[at]?.place && cells[other]?.absent?.words === words
  if (same(at - 1)) return 0
  let span = 1
  while (same(at + span)) span += 1
  return span
}

/** Least width of a column: its widest value, so that scrolling a long table never moves it. */
function widthOf({ rows }: Sheet, column: SheetColumn, at: number): string | undefined {
  if (column.words) return undefined
  let [low, high] = [Infinity, -Infinity]
  for (const { cells } of rows) {
    const value = cells[at]?.value
    if (typeof value !== 'number') continue
    low = Math.min(low, value)
    high = Math.max(high, value)
  }
  const letters = [low, high].map((value) => shownValue({ value }, column)?.length ?? 0)
  return Number.isFinite(high) ? `${Math.max(...letters) + 2.5}ch` : undefined
}

function cellOf(column: SheetColumn, at: number, universes: readonly ReadyUniverse[]) {
  const universe = universes.find(({ place }) => place === column.place)
  const other = universes.find(({ place }) => place !== column.place)
  return function Cell({ cells }: SheetRow) {
    const cell = cells[at]
    if (!cell) return null
    if (cell.absent)
      return (
        <span
          title={cell.absent.sentence}
          style={column.place === null ? undefined : { color: `var(--${toneOf(column.place)})` }}
        >
          {cell.absent.words}
        </span>
      )
    const shown = cell.shown ?? shownValue(cell, column) ?? '–'
    const z = cells[0]?.value
    return universe && column.quantity && typeof cell.value === 'number' && typeof z === 'number' ? (
      <OpeningNumber
        shown={shown}
        value={cell.value}
        z={z}
        quantity={column.quantity}
        universe={universe}
        other={other}
      />
    ) : (
      shown
    )
  }
}

/** The columns of a sheet as the table wants them. */
export function sheetColumns(sheet: Sheet, universes: readonly ReadyUniverse[]): TableColumn<SheetRow>[] {
  return sheet.columns.map((column, at) => ({
    id: column.id,
    head: plainHead(column),
    shownHead: <HeadOf head={column.head} below={column.below} />,
    unit: column.unit,
    align: column.words ? 'left' : 'right',
    width: widthOf(sheet, column, at),
    value: ({ cells }) => cells[at]?.value,
    span: column.place === null ? undefined : (row) => spanOf(sheet.columns, row, at),
    cell: cellOf(column, at, universes),
  }))
}
