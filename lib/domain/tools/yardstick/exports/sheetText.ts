import { formatNumber, formatSignificant } from '@/lib/format'
import type { SheetCell, SheetColumn } from '../sheets/sheet'

/** A value as the page shows it; null where there is none. */
export function shownValue({ value }: SheetCell, { decimals }: SheetColumn): string | null {
  if (value === null) return null
  if (typeof value === 'string') return value
  return decimals === null ? formatSignificant(value, 5) : formatNumber(value, decimals)
}

/** The head of a column in one line of plain text: `D_L`. */
export const plainHead = ({ head, below }: SheetColumn): string => (below ? `${head}_${below}` : head)
