import { bandOf } from './bandOf'
import { bandInName } from './bandInName'
import { cellReader } from './cellReader'
import { columnUnits } from './columnUnits'
import type { Mapping, TargetColumn } from '../targetColumn'
import type { Table, TableColumn } from './types'

export interface ColumnReading extends TableColumn {
  /** What it is read as; null when it is left out. */
  taken: TargetColumn | null
  /** The first text in it. */
  sample: string
  /** How its cells are turned into a target's, where they are. */
  note: string
  problem: string | null
}

function noteOf(column: TargetColumn, file: TableColumn, hasBand: boolean): string {
  const { factor, problem } = cellReader(column, file)
  if (problem) return ''
  const own = columnUnits.get(column)
  if (Math.abs(factor - 1) > 1e-12) return `${file.unit}, turned into ${own ?? ''}`
  if (column !== 'magnitude' || hasBand) return file.unit
  const band = bandInName(file)
  return `in ${bandOf(band, '')}${band ? '' : ', as no band is named'}`
}

/** What each column of a table was taken for, in the order of the file. */
export function describeColumns(table: Table, mapping: Mapping): ColumnReading[] {
  return table.columns.map((file, index) => {
    const taken = mapping[index] ?? null
    return {
      ...file,
      taken,
      sample: table.records.find((record) => (record[index] ?? '').trim() !== '')?.[index]?.trim() ?? '',
      note: taken ? noteOf(taken, file, mapping.includes('band')) : file.unit,
      problem: taken ? cellReader(taken, file).problem : null,
    }
  })
}
