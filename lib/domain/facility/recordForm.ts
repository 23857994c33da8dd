import type { HorizonPoint } from './types'

/** A number as it stands in a form: every digit that is kept, no rounding noise of arithmetic. */
export const typed = (value: number | null): string =>
  value === null ? '' : String(Number(value.toPrecision(15)))

/** A row of a table in a form: what it is at, and the value there. */
export interface TypedRow {
  at: string
  value: string
}

export const typedBands = (values: Record<string, number>): TypedRow[] =>
  Object.entries(values).map(([at, value]) => ({ at, value: typed(value) }))

export const typedHorizon = (rows: readonly HorizonPoint[]): TypedRow[] =>
  rows.map(({ azimuthDeg, altitudeDeg }) => ({ at: typed(azimuthDeg), value: typed(altitudeDeg) }))

/** A field of a record as comparisons name it. */
export interface FieldWords {
  label: string
  unit?: string
}
