import type { ReadyUniverse } from '../universes'
import type { Sheet, SheetCell, SheetColumn } from '../sheets/sheet'
import { groupsOf } from '../sheets/groupsOf'
import { latexText, latexUnit } from './latexText'
import { shownValue } from './sheetText'

function cellText(cell: SheetCell, column: SheetColumn): string {
  const text = shownValue(cell, column)
  if (text === null) return '\\dots'
  const [, mantissa, power] = /^(.*?)\s×\s10([⁻⁰¹²³⁴⁵⁶⁷⁸⁹]+)$/.exec(text) ?? []
  if (mantissa === undefined || power === undefined) return latexText(text)
  const exponent = [...power]
    .map((digit) => '⁻⁰¹²³⁴⁵⁶⁷⁸⁹'.indexOf(digit))
    .map((at) => (at === 0 ? '-' : at - 1))
    .join('')
  return `$${mantissa.replace('−', '-')}\\times10^{${exponent}}$`
}

const line = (cells: readonly string[]) => `    ${cells.join(' & ')} \\\\`

/** The sheet as a LaTeX table without extra packages: heads, units, values as shown, and where they come from. */
export function sheetLatex(sheet: Sheet, universes: readonly ReadyUniverse[], citation: string): string {
  const { title, columns, rows } = sheet
  const groups = groupsOf(columns, universes)
  const named = groups.some(({ place }) => place !== null)
  const heads = columns.map(({ latex, head }) => (latex ? `$${latex}$` : latexText(head)))
  const units = columns.map(({ fileUnit }) => (fileUnit ? `(${latexUnit(fileUnit)})` : ''))
  return [
    '\\begin{table}',
    '  \\centering',
    `  \\caption{${latexText(`${title}. ${citation}`)}}`,
    `  \\begin{tabular}{${columns.map(({ words }) => (words ? 'l' : 'r')).join('')}}`,
    '    \\hline',
    ...(named ? [line(groups.map(({ span, name }) => `\\multicolumn{${span}}{c}{${latexText(name)}}`))] : []),
    line(heads),
    line(units),
    '    \\hline',
    ...rows.map(({ cells }) => line(cells.map((cell, at) => cellText(cell, columns[at] as SheetColumn)))),
    '    \\hline',
    '  \\end{tabular}',
    '\\end{table}',
    '',
  ].join('\n')
}
