import type { TargetRow } from '@/lib/domain/targets/schema'
import { countInWords } from '@/lib/format'
import { cellNames } from './cellNames'

/** What a change to one row was: `redshift of HE 0047−1756`, or `three cells of HE 0047−1756`. */
export function changeWords(before: TargetRow, after: TargetRow): string {
  const cells = (Object.keys(cellNames) as (keyof TargetRow)[]).filter((cell) => before[cell] !== after[cell])
  const [only] = cells
  const named = only && cells.length === 1 ? cellNames[only] : countInWords(cells.length, 'cell', 'cells')
  return `${named.charAt(0).toLowerCase()}${named.slice(1)} of ${before.name || after.name}`
}
