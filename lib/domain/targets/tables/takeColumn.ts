import type { Mapping, TargetColumn } from '../targetColumn'

/** Takes a column for something else, or for nothing; another that was taken for it is left out then. */
export const takeColumn = (mapping: Mapping, index: number, taken: TargetColumn | null): Mapping =>
  mapping.map((column, place) => {
    if (place === index) return taken
    return column === taken ? null : column
  })
