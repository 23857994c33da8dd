import { ABSENT } from '@/lib/format'
import type { ReadyUniverse } from '../universes'
import { groupsOf } from '../sheets/groupsOf'
import type { Sheet, SheetColumn } from '../sheets/sheet'
import { plainHead, shownValue } from './sheetText'

const GAP = '  '
const width = (texts: readonly string[]) => texts.reduce((most, text) => Math.max(most, [...text].length), 0)
const pad = (text: string, to: number, { words }: SheetColumn) => {
  const room = ' '.repeat(Math.max(0, to - [...text].length))
  return words ? text + room : room + text
}

/** Why some values are absent, once for each reason. */
function absences({ columns, rows }: Sheet, universes: readonly ReadyUniverse[]): string[] {
  const reasons = rows.flatMap(({ cells }) =>
    cells.flatMap(({ absent }, at) => {
      const name = universes.find(({ place }) => place === columns[at]?.place)?.name
      return absent ? [`${ABSENT} ${name ? `under ${name}: ` : ''}${absent.words}`] : []
    }),
  )
  return [...new Set(reasons)]
}

/** The sheet as text that lines up in a letter or a log: heads, units, values as shown, then the citation. */
export function sheetPlain(sheet: Sheet, universes: readonly ReadyUniverse[], citation: string): string {
  const { columns, rows } = sheet
  const body = columns.map((column, at) => [
    plainHead(column),
    column.unit ?? '',
    ...rows.map(({ cells }) => {
      const cell = cells[at]
      return (cell && shownValue(cell, column)) ?? ABSENT
    }),
  ])
  const widths = body.map(width)
  let from = 0
  const names = groupsOf(columns, universes)
    .map(({ name, span }) => {
      const room =
        widths.slice(from, from + span).reduce((sum, one) => sum + one, 0) + GAP.length * (span - 1)
      from += span
      return name.slice(0, room).padEnd(room)
    })
    .join(GAP)
  const lines = Array.from({ length: rows.length + 2 }, (_, row) =>
    columns.map((column, at) => pad(body[at]?.[row] ?? '', widths[at] ?? 0, column)).join(GAP),
  )
  const head = names.trim() ? [names] : []
  return `${[sheet.title, '', ...head, ...lines, '', ...absences(sheet, universes), citation].map((one) => one.trimEnd()).join('\n')}\n`
}
