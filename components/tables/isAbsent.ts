import type { CellValue } from './tableColumn'

/** True for a cell without a value: it sorts last in both directions and shows a dash. */
export function isAbsent(value: CellValue): value is null | undefined | '' {
  return (
    value === null ||
    value === undefined ||
    value === '' ||
    (typeof value === 'number' && Number.isNaN(value))
  )
}
