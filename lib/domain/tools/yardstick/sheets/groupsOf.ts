import type { ReadyUniverse } from '../universes'
import type { SheetColumn } from './sheet'

export interface SheetGroup {
  /** The cosmology's place; null over columns that belong to none. */
  place: number | null
  name: string
  span: number
}

/** Neighbouring columns under one cosmology, as the groups of a head. */
export function groupsOf(columns: readonly SheetColumn[], universes: readonly ReadyUniverse[]): SheetGroup[] {
  const groups: SheetGroup[] = []
  for (const { place } of columns) {
    const last = groups[groups.length - 1]
    if (last && last.place === place) last.span += 1
    else groups.push({ place, name: universes.find((one) => one.place === place)?.name ?? '', span: 1 })
  }
  return groups
}
